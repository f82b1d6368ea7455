import type { EntryName } from '../duty/duty-entry';
import type { DutyText } from '../duty/duty-text';
import { entryWords } from '../duty/entry-words';
import type { ReadDuty } from '../duty/read-duty';
import type { ChangeDuty } from './change-duty';
import { DutyEntryField } from './duty-entry-field';

/** What every group of the duty is given. */
export interface DutyGroupProps {
  duty: DutyText;
  read: ReadDuty;
  onChange: ChangeDuty;
}

/** Whether an entry of the group cannot be read or was refused. */
export const wrongIn = (read: ReadDuty, names: readonly EntryName[]): boolean =>
  names.some((name) => read.errors[name] !== undefined);

/** The entries of a group that are filled, as words; or what stands for none. */
export function summaryOf(duty: DutyText, names: readonly EntryName[], none: string): string {
  const stated = names.flatMap((name) => {
    const text = duty.entries[name]?.trim();
    return text ? [entryWords(name, text)] : [];
  });
  return stated.length === 0 ? none : stated.join(', ');
}

/** Entries of the duty below each other. */
export function Entries({ names, duty, read, onChange }: DutyGroupProps & { names: readonly EntryName[] }) {
  return names.map((name) => (
    <DutyEntryField key={name} name={name} duty={duty} errors={read.errors} onChange={onChange} />
  ));
}
