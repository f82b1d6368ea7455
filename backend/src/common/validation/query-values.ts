import { Transform } from 'class-transformer';

/** A query parameter that is a number: text that is one becomes it, anything else stays and fails its check. */
export function NumberFromText(): PropertyDecorator {
  return Transform(({ value }: { value: unknown }) =>
    typeof value === 'string' && /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(value) ? Number(value) : value,
  );
}

/** A query parameter that is `true` or `false`. */
export function BooleanFromText(): PropertyDecorator {
  return Transform(({ value }: { value: unknown }) =>
    value === 'true' ? true : value === 'false' ? false : value,
  );
}

/** A query parameter that may be given several times; once makes a list of one. */
export function ListFromText(): PropertyDecorator {
  return Transform(({ value }: { value: unknown }) => (typeof value === 'string' ? [value] : value));
}
