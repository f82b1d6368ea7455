import type { ValidationError } from 'class-validator';
import type { FieldError } from '../problems/problem';
import { escapePointer } from './refuse-unusable-values';

/** The faults that class-validator found, flattened to JSON pointers. */
export function fieldErrors(faults: readonly ValidationError[], parent = ''): FieldError[] {
  return faults.flatMap((fault) => {
    const pointer = `${parent}/${escapePointer(fault.property)}`;
    const own = Object.entries(fault.constraints ?? {}).map(([constraint, message]) => ({
      pointer,
      message:
        constraint === 'whitelistValidation' ? 'is not a known field' : withoutName(message, fault.property),
    }));
    return [...own, ...fieldErrors(fault.children ?? [], pointer)];
  });
}

/** The pointer names the field already: "power must be a number" becomes "must be a number". */
function withoutName(message: string, property: string): string {
  return message.startsWith(`${property} `) ? message.slice(property.length + 1) : message;
}
