import { smallFamilyFile } from '../../../test/support/small-catalogue';
import { readFamily } from './read-family';
import { SeedDataError } from './seed-data-error';

type Plain = Record<string, unknown>;

/** A family's file with a change made deep inside it; the path's numbers are places in lists. */
function changed(path: string, value: unknown): Plain {
  const file = structuredClone(smallFamilyFile('TSTA', 'NORTH')) as Plain;
  const names = path.split('.');
  const last = names.pop() ?? '';
  let inner: Plain = file;
  for (const name of names) inner = inner[name] as Plain;
  if (value === undefined) Reflect.deleteProperty(inner, last);
  else inner[last] = value;
  return file;
}

function refusal(file: unknown): string {
  try {
    readFamily('families/tsta.json', file);
  } catch (error) {
    if (error instanceof SeedDataError) return error.message;
    throw error;
  }
  return 'accepted';
}

const size = 'revisions.0.sizes.0603';

describe('reading a family', () => {
  it('gives quantities in SI and keeps what is missing apart from nought', () => {
    const family = readFamily('families/tsta.json', changed(`${size}.voltageCoefficient`, undefined));
    const ratings = family.revisions[0]!.sizes.get('0603')!;
    expect(ratings.modes[0]!['rated_dissipation_watt']).toBe(0.1);
    expect(ratings.columns['link_residual_resistance_ohm']).toBe(0.05);
    expect(ratings.columns['voltage_coefficient_per_volt']).toBeNull();
    expect(family.revisions[0]!.ranges[0]).toMatchObject({
      tolerance: 0.01,
      tcr: 100e-6,
      min: 100,
      max: 330,
    });
  });

  it.each([
    ['code', undefined, 'families/tsta.json, code: is missing'],
    ['colour', 'red', 'families/tsta.json, colour: is not a known field'],
    ['technology', 'thick', 'technology: must be one of thick-film'],
    ['entered.on', '2026-02-30', 'entered.on: must be a day such as 2026-12-01, not “2026-02-30”'],
    ['datasheets.0.pages', 0, 'datasheets[0].pages: must be a whole number of at least 1'],
    ['revisions.0.number', 2, 'revisions[0].number: must be 1'],
    [
      'revisions.0.datasheet',
      'DOC-X 1',
      'revisions[0].datasheet: “DOC-X 1” is not a datasheet of the family',
    ],
    ['revisions.0.published.by', 'enterer', 'nobody publishes what he or she entered'],
    ['revisions.0.published.on', '2026-01-04', 'revisions[0].published.on: comes before it was entered'],
    ['revisions.0.orderingCode', '{size}', 'revisions[0].orderingCode: Without {resistance:…}'],
    ['revisions.0.features', ['shiny'], 'revisions[0].features: “shiny” is not one of'],
    ['revisions.0.ranges.0.span', ['330 Ω', '100 Ω'], 'revisions[0].ranges[0].span: must rise'],
    ['revisions.0.ranges.0.series', ['E7'], 'revisions[0].ranges[0].series: “E7” is not one of'],
    [
      'revisions.0.ranges.0.sizes',
      ['0805'],
      'revisions[0].ranges[0].sizes: “0805” is not a size of the family',
    ],
    ['revisions.0.ranges.1.tcr', '100 ppm/K', 'revisions[0].ranges[1]: overlaps another row'],
    [
      'revisions.0.citations',
      [{ fields: ['colour'], page: 1 }],
      'citations[0].fields: “colour” is no rating',
    ],
    [
      'revisions.0.citations',
      [{ fields: ['body'], page: 9 }],
      'citations[0].page: the datasheet has only 4 pages',
    ],
    ['revisions', {}, 'families/tsta.json, revisions: must be a list of objects'],
    ['revisions.0.common', 'chip', 'revisions[0].common: must be an object'],
    [size, 'chip', 'revisions[0].sizes.0603: must be an object'],
    [`${size}.modes`, [], 'revisions[0].sizes.0603.modes: needs at least one operating mode'],
    [`${size}.modes.0.dissipation`, 0.1, 'modes[0].dissipation: must be a text with its unit'],
    [`${size}.modes.0.dissipation`, '0.1 V', 'revisions[0].sizes.0603.modes[0].dissipation: “0.1 V”'],
    [`${size}.overloadVoltage`, '50 V', 'revisions[0].lacks.overloadVoltage: 0603 does give it'],
    [
      'revisions.0.lacks.drift',
      undefined,
      'revisions[0].sizes.0603.drift: is missing and not listed under lacks',
    ],
    [
      `${size}.modes.0.derating`,
      {
        axis: 'ambient',
        points: [
          ['70 °C', 1],
          ['60 °C', 0],
        ],
      },
      'modes[0].derating: the points of the derating curve must rise in temperature',
    ],
    [
      `${size}.pulses`,
      {
        single: [
          ['1 ms', '1 W'],
          ['10 ms', '2 W'],
        ],
      },
      'pulses.single[1]: must be a longer pulse with no more than the one before',
    ],
  ])('refuses %s = %j', (path, value, words) => {
    expect(refusal(changed(path, value))).toContain(words);
  });

  it('writes out a revision that is based on another', () => {
    const file = smallFamilyFile('TSTA', 'NORTH') as { revisions: Plain[] };
    const [first] = file.revisions;
    file.revisions.push({
      number: 2,
      basedOn: 1,
      description: 'Second',
      datasheet: 'DOC-TSTA 1',
      entered: { by: 'enterer', on: '2026-03-02' },
      published: { by: 'publisher', on: '2026-03-03' },
      sizes: { '0603': { link: null, modes: [{ dissipation: '0.2 W' }] } },
    });
    const [one, two] = readFamily('families/tsta.json', file).revisions.map((revision) =>
      revision.sizes.get('0603')!,
    );
    expect([one!.isLinkToo, two!.isLinkToo]).toEqual([true, false]);
    expect([one!.modes[0]!['rated_dissipation_watt'], two!.modes[0]!['rated_dissipation_watt']]).toEqual([
      0.1, 0.2,
    ]);
    expect(two!.modes[0]!['name']).toBe('standard');
    expect(first!['sizes']).toEqual(
      (smallFamilyFile('TSTA', 'NORTH') as { revisions: Plain[] }).revisions[0]!['sizes'],
    );
    (file.revisions[1] as Plain)['basedOn'] = 7;
    expect(refusal(file)).toContain('revisions[1].basedOn: must be the number of a revision given in full');
  });
});
