import type { FieldError } from '../problems/problem';

/** Deeper nesting than any request of ours has; stops bodies made to exhaust the stack. */
const DEEPEST = 32;
const FORBIDDEN_NAMES = new Set(['__proto__', 'constructor', 'prototype']);

/**
 * Values that no field takes, wherever they stand: null (an absent field says "missing"), numbers beyond the
 * floating-point range (`1e999` arrives as Infinity), text with NUL characters, and names that would reach into
 * the prototype.
 *
 * @returns one error a value, with its JSON pointer
 */
export function unusableValues(value: unknown, pointer = '', depth = 0): FieldError[] {
  if (depth > DEEPEST) return [{ pointer, message: `must not be nested deeper than ${DEEPEST} levels` }];
  if (value === null)
    return [{ pointer, message: 'must not be null; leave the field out where there is no value' }];
  if (typeof value === 'number' && !Number.isFinite(value)) {
    return [{ pointer, message: 'must be a finite number' }];
  }
  if (typeof value === 'string' && value.includes('\0')) {
    return [{ pointer, message: 'must not contain a NUL character' }];
  }
  if (typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([name, item]: [string, unknown]) => {
    const itemPointer = `${pointer}/${escapePointer(name)}`;
    if (FORBIDDEN_NAMES.has(name)) return [{ pointer: itemPointer, message: 'is not a known field' }];
    return unusableValues(item, itemPointer, depth + 1);
  });
}

/** One reference token of a JSON pointer (RFC 6901, section 3). */
export function escapePointer(name: string): string {
  return name.replaceAll('~', '~0').replaceAll('/', '~1');
}
