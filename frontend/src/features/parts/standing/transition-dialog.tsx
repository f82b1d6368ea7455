import { chakra } from '@chakra-ui/react';
import { type AnySchema, string } from 'yup';
import { problemOf } from '../../../api/problem';
import { ConfirmWithReason } from '../../../components/confirm-with-reason';
import { FormField } from '../../../components/form-field';
import { approvalWords, supplyWords } from '../../../wording/standing-words';
import { type StandingChange, useChangeStanding } from '../requests/change-standing';
import type { PartDetails } from '../requests/get-part';
import { DemandList } from './demand-list';
import type { Offered } from './transition-words';

const longest = 1000;
const needed = (words: string) =>
  string().trim().required(words).max(longest, `At most ${longest} characters.`);

/** The entries that a change asks for beside its reason, by name. */
const entriesOf = {
  restricted: {
    words: { label: 'What it may not be used for, or only for', rule: needed('Say it in words.') },
    scope: { label: 'Scope: the products or sites it holds for', rule: needed('Name the scope.') },
  },
  preferred: {
    exception: {
      label: 'Exception, where one source shall do',
      rule: string().trim().max(longest, `At most ${longest} characters.`),
    },
  },
  'last-time-buy': {
    lastOrderDate: { label: 'Last order date', rule: string().required('Give the last order date.') },
  },
} as const;

type EntryName = 'words' | 'scope' | 'exception' | 'lastOrderDate';
interface Entry {
  label: string;
  rule: AnySchema;
}

function entriesFor({ transition }: Offered): Partial<Record<EntryName, Entry>> {
  const { to } = transition;
  if (to === 'restricted' || to === 'last-time-buy') return entriesOf[to];
  const needsException = transition.demands.some(({ field, met }) => field === 'exception' && !met);
  return to === 'preferred' && needsException ? entriesOf.preferred : {};
}

type Values = Record<EntryName, string>;
const noValues: Values = { words: '', scope: '', exception: '', lastOrderDate: '' };

/** A restriction is changed from what it says now, a last order date from what it is. */
function valuesOf({ restriction, lastOrderOn }: PartDetails, { transition }: Offered): Values {
  if (transition.to === 'restricted' && restriction !== undefined) {
    return { ...noValues, words: restriction.words, scope: restriction.scope ?? '' };
  }
  return transition.to === 'last-time-buy' ? { ...noValues, lastOrderDate: lastOrderOn ?? '' } : noValues;
}

/** What was filled in, as the server takes it: an entry left empty is left out. */
function changeOf(offered: Offered, version: number, values: Values & { reason: string }): StandingChange {
  const said = (name: EntryName) => {
    const text = values[name].trim();
    return text === '' ? {} : { [name]: text };
  };
  const { reason } = values;
  return offered.door === 'approval'
    ? {
        door: 'approval',
        form: {
          to: offered.transition.to,
          reason,
          version,
          ...said('words'),
          ...said('scope'),
          ...said('exception'),
        },
      }
    : { door: 'supply', form: { to: offered.transition.to, reason, version, ...said('lastOrderDate') } };
}

export interface TransitionDialogProps {
  part: PartDetails;
  offered: Offered;
  /** Of the part as it was last read. */
  version: number;
  onClose: () => void;
}

const namesOf = ({ companyPartNumber, manufacturerPartNumber }: PartDetails): string =>
  companyPartNumber === undefined
    ? manufacturerPartNumber
    : `${companyPartNumber.number}, ${manufacturerPartNumber}`;

/** One change of approval or supply, with what it demands, asked about once more. */
export function TransitionDialog({ part, offered, version, onClose }: TransitionDialogProps) {
  const change = useChangeStanding(part.id);
  const entries = Object.entries(entriesFor(offered)) as [EntryName, Entry][];
  const problem = change.error === null ? undefined : problemOf(change.error);
  const now = offered.door === 'approval' ? approvalWords[part.approval] : supplyWords[part.supply];
  return (
    <ConfirmWithReason
      title={offered.deed}
      description={`${namesOf(part)}. It is ${now.toLowerCase()} now.`}
      act={offered.deed}
      initialValues={valuesOf(part, offered)}
      rules={Object.fromEntries(entries.map(([name, { rule }]) => [name, rule]))}
      error={change.error}
      onConfirm={(values) => change.mutateAsync(changeOf(offered, version, values))}
      onClose={onClose}
    >
      {problem?.status === 409 && (
        <chakra.p role="status" fontSize="sm">
          The part has been read again: it is {now.toLowerCase()} now. What you wrote is still here.
        </chakra.p>
      )}
      {/* What an entry below fulfils is asked there. */}
      <DemandList
        demands={offered.transition.demands.filter(({ field }) => !entries.some(([name]) => name === field))}
      />
      {entries.map(([name, { label }]) => (
        <FormField
          key={name}
          name={name}
          label={label}
          type={name === 'lastOrderDate' ? 'date' : 'text'}
          multiline={name === 'words' || name === 'exception'}
          refusal={problem?.at(`/${name}`)}
        />
      ))}
    </ConfirmWithReason>
  );
}
