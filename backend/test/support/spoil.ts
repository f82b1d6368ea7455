/** Stands for a number that JSON can write and floating point cannot hold. */
const BEYOND = '@beyond@';
/** Longer than any text that a field of ours takes, shorter than the largest body. */
const ENDLESS = 'x'.repeat(20_000);
const MARKED = 'unknown"field';

export interface Spoilt {
  what: string;
  /** JSON, ready to be sent. */
  body: string;
  /** JSON pointer of the field that is wrong. */
  pointer: string;
  /** Refused by its kind alone, whatever stands in the catalogue: 400, naming the field. */
  certain: boolean;
}

type Json = string | number | boolean | null | Json[] | { [name: string]: Json };

/** Every way to spoil one field of a body that is taken as it is: each leaf and each object of it in turn. */
export function spoil(body: object): Spoilt[] {
  const whole = body as Json;
  return placesOf(whole).flatMap(({ pointer, value }) => [
    ...replacements(value).map(({ what, by, certain }) => ({
      what: `${what} at ${pointer}`,
      body: written(replaced(whole, pointer.split('/').slice(1), by)),
      pointer,
      certain,
    })),
    ...(isObject(value) ? additions(whole, pointer, value) : []),
  ]);
}

function replacements(value: Json): { what: string; by: Json; certain: boolean }[] {
  const other: Json = typeof value === 'string' ? 7 : Array.isArray(value) || isObject(value) ? 'x' : 'x';
  return [
    { what: 'null', by: null, certain: true },
    { what: 'another kind of value', by: other, certain: true },
    ...(typeof value === 'number'
      ? [
          { what: 'infinity', by: BEYOND, certain: true },
          { what: 'the number as text', by: String(value), certain: true },
          { what: 'a negative number', by: -1, certain: false },
          { what: 'an absurd size', by: 1e300, certain: false },
          { what: 'a size next to nothing', by: 1e-300, certain: false },
          { what: 'a list of it', by: [value], certain: true },
        ]
      : []),
    ...(typeof value === 'string'
      ? [
          { what: 'a NUL character', by: `${value}\0`, certain: true },
          { what: 'an endless text', by: ENDLESS, certain: true },
          { what: 'a list of it', by: [value], certain: true },
          { what: 'wildcards and quotes', by: `%_*'"; DROP TABLE parts; --`, certain: false },
          { what: 'nothing', by: '', certain: false },
        ]
      : []),
    ...(Array.isArray(value)
      ? [{ what: 'an endless list', by: Array<Json>(20_000).fill(1), certain: true }]
      : []),
  ];
}

function additions(whole: Json, pointer: string, value: { [name: string]: Json }): Spoilt[] {
  const path = pointer.split('/').slice(1);
  const withField = (name: string, content: Json): string =>
    written(replaced(whole, path, { ...value, [name]: content }));
  return [
    {
      what: `an unknown field in ${pointer || 'the body'}`,
      body: withField(MARKED, 1),
      pointer: `${pointer}/${MARKED}`,
      certain: true,
    },
    {
      what: `a way into the prototype in ${pointer || 'the body'}`,
      body: withField('@proto@', { admin: true }).replace('"@proto@"', '"__proto__"'),
      pointer: `${pointer}/__proto__`,
      certain: true,
    },
  ];
}

function placesOf(value: Json, pointer = ''): { pointer: string; value: Json }[] {
  const own = pointer === '' && !isObject(value) ? [] : [{ pointer, value }];
  if (Array.isArray(value)) {
    // One element stands for all of them.
    const [first] = value;
    return [...own, ...(first === undefined ? [] : placesOf(first, `${pointer}/0`))];
  }
  if (!isObject(value)) return own;
  return [...own, ...Object.entries(value).flatMap(([name, item]) => placesOf(item, `${pointer}/${name}`))];
}

const isObject = (value: Json): value is { [name: string]: Json } =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

function replaced(value: Json, path: readonly string[], by: Json): Json {
  const [name, ...rest] = path;
  if (name === undefined) return by;
  if (Array.isArray(value))
    return value.map((item, at) => (String(at) === name ? replaced(item, rest, by) : item));
  if (!isObject(value)) return value;
  return { ...value, [name]: replaced(value[name] ?? null, rest, by) };
}

const written = (body: Json): string => JSON.stringify(body).replaceAll(`"${BEYOND}"`, '1e999');
