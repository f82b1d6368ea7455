import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { StatusWord } from '../../../components/status-word';
import { dayWords } from '../../../wording/date-words';
import type { PartDetails } from '../requests/get-part';
import { Quiet, Section } from './section';

const Steps = chakra('ol', {
  base: {
    '& > li': {
      display: 'grid',
      gridTemplateColumns: '6.5rem minmax(0, 1fr)',
      columnGap: 3,
      py: 1.5,
      borderBottom: '1px solid',
      borderColor: 'border',
      fontSize: 'sm',
    },
    '& time': { color: 'fg.muted' },
    '& small': { display: 'block', color: 'fg.muted', fontSize: 'xs' },
  },
});

interface StepProps {
  status: ReactNode;
  at: string;
  by: string;
  reason: string;
  more?: string;
}

function Step({ status, at, by, reason, more }: StepProps) {
  return (
    <li>
      <time dateTime={at}>{dayWords(at)}</time>
      <div>
        {status}
        {more !== undefined && more !== '' && <small>{more}</small>}
        <chakra.small whiteSpace="pre-line">
          {by}: {reason}
        </chakra.small>
      </div>
    </li>
  );
}

/** How approval and supply came to be what they are, the newest first. */
export function HistorySection({ part }: { part: PartDetails }) {
  const entered = `Entered by ${part.enteredBy.name}, ${dayWords(part.enteredAt)}.`;
  return (
    <>
      <Section title="Approval history">
        <Steps>
          {part.approvalHistory.map((step) => (
            <Step
              key={`${step.changedAt} ${step.to}`}
              status={<StatusWord kind="approval" status={step.to} />}
              at={step.changedAt}
              by={step.changedBy.name}
              reason={step.reason}
              more={[
                step.words,
                step.scope && `Scope: ${step.scope}.`,
                step.exception && `Exception: ${step.exception}`,
              ]
                .filter(Boolean)
                .join(' ')}
            />
          ))}
        </Steps>
        <Quiet>{entered}</Quiet>
      </Section>
      <Section title="Supply history">
        {part.supplyHistory.length === 0 ? (
          <Quiet>Nothing has changed since it was entered.</Quiet>
        ) : (
          <Steps>
            {part.supplyHistory.map((step) => (
              <Step
                key={`${step.changedAt} ${step.to}`}
                status={<StatusWord kind="supply" status={step.to} />}
                at={step.changedAt}
                by={step.changedBy.name}
                reason={step.reason}
                more={step.lastOrderOn && `Last order on ${dayWords(step.lastOrderOn)}.`}
              />
            ))}
          </Steps>
        )}
      </Section>
    </>
  );
}
