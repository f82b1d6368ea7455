import { Problem } from '../../api/problem';
import { type EntryName, entryDefinitions, entryNames } from './duty/duty-entry';
import type { ReadDuty } from './duty/read-duty';

/** The entry that a pointer into the request speaks of: the longest one whose own pointer it begins with. */
function entryAt(pointer: string): EntryName | undefined {
  const inDuty = pointer.replace(/^\/duty/, '');
  return entryNames
    .filter((name) => inDuty.startsWith(entryDefinitions[name].pointer))
    .sort(
      (first, second) => entryDefinitions[second].pointer.length - entryDefinitions[first].pointer.length,
    )[0];
}

/** What the server refused, put at the entries it names, beside what the browser itself could not read. */
export function withServerErrors(read: ReadDuty, error: Error | null): ReadDuty {
  if (!(error instanceof Problem)) return read;
  const errors = { ...read.errors };
  for (const field of error.fields) {
    const name = entryAt(field.pointer);
    if (name !== undefined) errors[name] ??= field.message;
  }
  return { ...read, errors };
}
