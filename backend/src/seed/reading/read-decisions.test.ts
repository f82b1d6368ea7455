import { smallFamilyFile } from '../../../test/support/small-catalogue';
import { expandParts } from '../expand-parts';
import { readApprovalRules, readSupplyRules } from './read-decisions';
import { readFamily } from './read-family';
import { PartIndex, type PartSelection } from './read-selection';

const family = readFamily('families/tsta.json', smallFamilyFile('TSTA', 'NORTH'));
const index = new PartIndex(expandParts(family).map((part, place) => ({ ...part, id: place + 1, family })));
const decided = { by: 'engineer', on: '2026-03-02' };

describe('decisions about parts', () => {
  const rule = (changes: object): object => ({
    decisions: [{ family: 'TSTA', to: 'approved', decided, reason: 'Because.', ...changes }],
  });

  it.each([
    [{ to: 'good' }, 'approvals.json, decisions[0].to: must be one of draft'],
    [{ words: 'Never.' }, 'decisions[0].words: belong to a restriction'],
    [{ to: 'restricted' }, 'decisions[0].words: belong to a restriction, and every restriction has them'],
    [{ tolerance: '1 V' }, 'decisions[0].tolerance: “1 V”'],
    [{ series: 'E25' }, 'decisions[0].series: must be one of E3'],
    [{ reason: '' }, 'decisions[0].reason: must be a text'],
    [{ size: ['0603'] }, 'decisions[0].size: is not a known field'],
  ])('refuses %j', (changes, words) => {
    expect(() => readApprovalRules('approvals.json', rule(changes))).toThrow(words);
  });

  it('demands a last day of a last-time buy', () => {
    const change = { family: 'TSTA', to: 'last-time-buy', decided, reason: 'Notice.' };
    expect(() => readSupplyRules('supply.json', { changes: [change] })).toThrow(
      'supply.json, changes[0].lastOrderOn: is missing',
    );
    const [read] = readSupplyRules('supply.json', { changes: [{ ...change, lastOrderOn: '2026-12-18' }] });
    expect(read?.lastOrderOn).toBe('2026-12-18');
  });
});

describe('selecting parts', () => {
  // The family has 100, 150, 220, 330 Ω at 1 % 100 ppm/K, 100 and 150 Ω at 1 % 200 ppm/K, 100 and 220 Ω at 5 %, a link.
  it.each([
    [{ family: 'TSTA' }, 8],
    [{ family: 'TSTA', links: true }, 1],
    [{ family: 'TSTA', tolerance: 0.05 }, 2],
    [{ family: 'TSTA', tolerance: 0.01, series: 'E3' }, 3],
    [{ family: 'TSTA', span: [150, 220] }, 4],
    [{ parts: ['TSTA0603F1003300'] }, 1],
  ] as [PartSelection, number][])('%j', (selection, count) => {
    expect(index.select(selection)).toHaveLength(count);
  });

  it.each([
    [{ family: 'TSTB' }, 'no part of TSTB'],
    [{ family: 'TSTA', sizes: ['0805'] }, 'no part of TSTA'],
    [{ parts: ['TSTA0603F1009999'] }, 'no family makes a part TSTA0603F1009999'],
  ] as [PartSelection, string][])('refuses %j, which selects nothing', (selection, words) => {
    expect(() => index.select(selection)).toThrow(words);
  });
});
