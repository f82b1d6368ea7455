import { Problem } from '../../api/problem';
import { type EntryName, entryDefinitions, entryNames } from './duty/duty-entry';
import { pulseEntryNames } from './duty/pulse-text';
import type { ReadDuty } from './duty/read-duty';

/** The entry that a pointer into the duty speaks of: the longest one whose own pointer it begins with. */
function entryAt(pointer: string): EntryName | undefined {
  return entryNames
    .filter((name) => `${pointer}/`.startsWith(`${entryDefinitions[name].pointer}/`))
    .sort(
      (first, second) => entryDefinitions[second].pointer.length - entryDefinitions[first].pointer.length,
    )[0];
}

/** What the server refused, put at the entries it names, beside what the browser itself could not read. */
export function withServerErrors(read: ReadDuty, error: Error | null): ReadDuty {
  if (!(error instanceof Problem)) return read;
  const errors = { ...read.errors };
  const pulseErrors = read.pulseErrors.map((pulse) => ({ ...pulse }));
  for (const { pointer, message } of error.fields) {
    const inDuty = pointer.replace(/^\/duty/, '');
    const name = entryAt(inDuty);
    if (name !== undefined) errors[name] ??= message;
    const [, at, field] = /^\/pulses\/(\d+)\/?(\w*)/.exec(inDuty) ?? [];
    const pulse = pulseErrors[Number(at)];
    // A pulse that is wrong as a whole says so at the entry that every shape but a surge has.
    const entry = pulseEntryNames.find((known) => known === field) ?? 'voltage';
    if (pulse !== undefined) pulse[entry] ??= message;
  }
  return { ...read, errors, pulseErrors };
}
