import { Matches } from 'class-validator';

/** Text that says something: more than blanks, and on one line. */
export function Filled(): PropertyDecorator {
  return Matches(/^[^\p{Cc}]*[^\s\p{Cc}][^\p{Cc}]*$/u, {
    message: '$property must not be empty, and must not contain line breaks or control characters',
  });
}
