import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { Button } from '../../../components/button';
import { Failed, Loading } from '../../../components/states';
import type { PartDetails } from '../requests/get-part';
import { type Transitions, useTransitions } from '../requests/get-transitions';
import { Quiet } from '../sections/section';
import { DemandList } from './demand-list';
import { TransitionDialog } from './transition-dialog';
import { type Offered, approvalDeed, supplyDeed } from './transition-words';

function offeredOf(transitions: Transitions): Offered[] {
  return [
    ...transitions.approvalTransitions.map((transition): Offered => ({
      door: 'approval',
      deed: approvalDeed(transitions.approval, transition.to),
      transition,
    })),
    ...transitions.supplyTransitions.map((transition): Offered => ({
      door: 'supply',
      deed: supplyDeed(transitions.supply, transition.to),
      transition,
    })),
  ];
}

const Deeds = chakra('ul', {
  base: {
    fontSize: 'sm',
    '& > li': { py: 2, borderBottom: '1px solid', borderColor: 'border' },
    '& b': { fontWeight: 'semibold' },
  },
});

/** What this person may do with the part, and, folded, what all changes demand and who may make them. */
export function StandingActions({ part }: { part: PartDetails }) {
  const transitions = useTransitions(part.id);
  const [chosen, setChosen] = useState<Offered>();
  if (transitions.isPending) return <Loading label="Reading what may become of it" lines={2} />;
  // Read again and failed, what was read before stays, and with it what is being typed.
  if (transitions.data === undefined)
    return <Failed error={transitions.error} onRetry={() => void transitions.refetch()} />;
  const all = offeredOf(transitions.data);
  // Read again after a stale change, it may demand something else by now.
  const current = all.find(
    ({ door, transition }) => door === chosen?.door && transition.to === chosen.transition.to,
  );
  const allowed = all.filter(({ transition }) => transition.allowed);
  return (
    <chakra.section aria-label="What may become of it">
      {allowed.length > 0 && (
        <chakra.div display="flex" flexWrap="wrap" gap={2}>
          {allowed.map((offered) => (
            <Button key={offered.deed} onClick={() => setChosen(offered)}>
              {offered.deed}
            </Button>
          ))}
        </chakra.div>
      )}
      <chakra.details mt={2} fontSize="sm">
        <chakra.summary cursor="pointer" py={1} color="fg.muted">
          {allowed.length === 0
            ? 'Your roles change nothing here: whose it is, and what it demands'
            : 'What each change demands, and whose it is'}
        </chakra.summary>
        <Deeds>
          {all.map(({ deed, transition }) => (
            <li key={deed}>
              <b>{deed}</b>
              {transition.forbiddenBy !== undefined && (
                <Quiet>
                  {transition.forbiddenBy.words} (rule: {transition.forbiddenBy.rule})
                </Quiet>
              )}
              <DemandList demands={transition.demands} />
              {transition.allowed && transition.demands.length === 0 && <Quiet>Only a reason.</Quiet>}
            </li>
          ))}
        </Deeds>
      </chakra.details>
      {chosen !== undefined && (
        <TransitionDialog
          part={part}
          offered={current ?? chosen}
          version={transitions.data.version}
          // One that is late to close must not take the next one along.
          onClose={() => setChosen((now) => (now === chosen ? undefined : now))}
        />
      )}
    </chakra.section>
  );
}
