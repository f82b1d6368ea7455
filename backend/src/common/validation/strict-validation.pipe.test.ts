import { IsInt, IsNumber, IsOptional, IsString } from 'class-validator';
import { MalformedProblem } from '../problems/problems';
import { Moment } from './moment';
import { Nested, NestedList } from './nested';
import { BooleanFromText, ListFromText, NumberFromText } from './query-values';
import { StrictValidationPipe } from './strict-validation.pipe';

class Span {
  @IsNumber()
  lower: number;

  @IsOptional()
  @IsNumber()
  upper?: number;
}

class Body {
  @Nested(() => Span)
  window: Span;

  @NestedList(() => Span, { optional: true, atMost: 2 })
  spans?: Span[];

  @IsOptional()
  @IsString()
  text?: string;

  @IsOptional()
  @Moment()
  day?: string;
}

class Query {
  @IsOptional()
  @NumberFromText()
  @IsInt()
  page?: number;

  @IsOptional()
  @BooleanFromText()
  shown?: boolean;

  @IsOptional()
  @ListFromText()
  @IsString({ each: true })
  family?: string[];
}

const pipe = new StrictValidationPipe();
const read = (value: unknown): Promise<unknown> => pipe.transform(value, { type: 'body', metatype: Body });
const readQuery = (value: unknown): Promise<unknown> =>
  pipe.transform(value, { type: 'query', metatype: Query });

async function pointersOf(answer: Promise<unknown>): Promise<string[]> {
  const error: unknown = await answer.then(
    () => undefined,
    (reason: unknown) => reason,
  );
  if (!(error instanceof MalformedProblem)) throw new Error('it was taken');
  return (error.members.errors ?? []).map(({ pointer, message }) => `${pointer} ${message}`);
}

describe('the strict validation pipe', () => {
  it('takes what the DTO declares', async () => {
    await expect(read({ window: { lower: 0.5 }, spans: [{ lower: 1 }] })).resolves.toEqual({
      window: { lower: 0.5 },
      spans: [{ lower: 1 }],
    });
  });

  it.each([
    [
      'an unknown field, at any depth',
      { window: { lower: 1, middle: 2 } },
      '/window/middle is not a known field',
    ],
    ['null', { window: { lower: 1 }, text: null }, '/text must not be null'],
    ['null where it is nested', { window: { lower: null } }, '/window/lower must not be null'],
    ['1e999', JSON.parse('{"window":{"lower":1e999}}'), '/window/lower must be a finite number'],
    ['a number as text', { window: { lower: '1' } }, '/window/lower must be a number'],
    ['an empty list for an object', { window: [] }, '/window must be an object'],
    ['text for an object', { window: 'x' }, '/window must be an object'],
    ['a missing field', {}, '/window must be an object'],
    ['a list of other things', { window: { lower: 1 }, spans: [1] }, '/spans must hold only objects'],
    ['a list in a list', { window: { lower: 1 }, spans: [[]] }, '/spans must hold only objects'],
    [
      'more than the list may hold',
      { window: { lower: 1 }, spans: [1, 2, 3].map((lower) => ({ lower })) },
      '/spans must contain no more than 2',
    ],
    ['a NUL character', { window: { lower: 1 }, text: 'a\0b' }, '/text must not contain a NUL'],
    [
      'a name that reaches into the prototype',
      JSON.parse('{"window":{"lower":1,"__proto__":{"x":1}}}'),
      '/window/__proto__ is not a known field',
    ],
    ['30 February', { window: { lower: 1 }, day: '2026-02-30' }, '/day must be a day'],
    ['a list for the body', [{ window: { lower: 1 } }], ' must be a JSON object'],
    ['text for the body', 'x', ' must be a JSON object'],
    ['nothing for the body', undefined, '/window must be an object'],
  ])('refuses %s', async (_what, value: unknown, expected) => {
    expect((await pointersOf(read(value))).join('\n')).toContain(expected);
  });

  it('reports all faults at once', async () => {
    expect(await pointersOf(read({ window: {}, text: 4, extra: true }))).toHaveLength(3);
  });

  it('stops at a depth that no request of ours has', async () => {
    const deep: unknown = JSON.parse(`${'['.repeat(5000)}${']'.repeat(5000)}`);
    expect((await pointersOf(read({ window: deep }))).join()).toContain('nested deeper than 32');
  });

  it('escapes the pointer of a name with a slash or a tilde (RFC 6901)', async () => {
    expect(await pointersOf(read({ window: { lower: 1 }, 'a/b~c': null }))).toEqual([
      expect.stringMatching(/^\/a~1b~0c must not be null/),
    ]);
  });

  it.each([
    ['12', 12],
    ['-1', -1],
    ['1e3', 1000],
  ])('reads the query parameter %s as a number', async (text, page) => {
    await expect(readQuery({ page: text })).resolves.toEqual({ page });
  });

  it.each(['', ' ', '0x10', '1,5', 'Infinity', '1e999', 'NaN', ['1', '2']])(
    'does not take the query parameter %p for a whole number',
    async (text) => {
      expect(await pointersOf(readQuery({ page: text }))).toEqual([expect.stringContaining('/page ')]);
    },
  );

  it('reads truth values and lists of a query', async () => {
    await expect(readQuery({ shown: 'true', family: 'ABC' })).resolves.toEqual({
      shown: true,
      family: ['ABC'],
    });
    await expect(readQuery({ family: ['ABC', 'DEF'] })).resolves.toEqual({ family: ['ABC', 'DEF'] });
  });
});
