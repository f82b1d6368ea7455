import { assess } from '../assessment/assess';
import { requirementOf } from '../duty/requirement';
import type { Duty } from '../duty/duty';
import type { Ratings } from '../ratings/ratings';
import { gentleDuty, thickFilmChip } from '../test-support/thick-film-chip';

const cautions = (duty: Duty, ratings: Ratings = thickFilmChip): Record<string, string> =>
  Object.fromEntries(
    assess({ modes: [{ ratings }] }, requirementOf(duty), 'none').cautions.map(({ kind, text }) => [
      kind,
      text,
    ]),
  );

it('says how hot the surface gets: 70 °C + 340 K/W · P', () => {
  // arithmetic: P ≈ 24² / (4700 · 0.97) ≈ 0.126 W, so about 113 °C
  expect(cautions(gentleDuty)['hot-surface']).toMatch(/About 11[2-4] °C/);
  expect(cautions({ ...gentleDuty, ambient: { min: 0, max: 20 } })['hot-surface']).toBeUndefined();
});

it.each([
  [29, false],
  [31, true], // 42.4 V peak is 30 V rms (IEC 60950-1, withdrawn)
])('%d V rms is hazardous: %s', (volt, hazardous) => {
  const duty: Duty = { load: { voltage: { min: 0, max: volt } }, ambient: { min: 0, max: 20 } };
  expect(cautions(duty)['hazardous-voltage'] !== undefined).toBe(hazardous);
});

it('asks for a certified type on the mains, and says where none is shown', () => {
  expect(cautions({ safety: { mains: true } })['certified-type']).toContain('shows no certificate');
  expect(
    cautions({ safety: { mains: true } }, { ...thickFilmChip, certificates: ['a standard 1'] })[
      'certified-type'
    ],
  ).toContain('covers this use');
});

it('names overload from 1 W where neither flameproof nor fusible, and gives no figure without an operating point', () => {
  const strong: Ratings = { ...thickFilmChip, ratedDissipation: 2 };
  expect(cautions({ ambient: { min: 0, max: 20 } }, strong)['flammability']).toContain('2.00 W');
  expect(
    cautions({ ambient: { min: 0, max: 20 } }, { ...strong, features: ['flameproof'] })['flammability'],
  ).toBeUndefined();
  const runaway: Duty = { load: { current: { min: 0, max: 1 } }, ambient: { min: 0, max: 60 } };
  expect(cautions(runaway, { ...thickFilmChip, tcr: 5000e-6 })['flammability']).toContain(
    'beyond any operating point',
  );
});

it('speaks of surge, stored charge, altitude and sulphur where the duty does', () => {
  const kinds = Object.keys(
    cautions({
      pulses: [
        { shape: 'surge-1.2/50', voltage: 1000 },
        { shape: 'capacitor-discharge', voltage: 50, capacitance: 1e-6 },
      ],
      ambient: { min: 0, max: 20, altitude: 3000 },
      features: ['sulphur-resistant'],
    }),
  );
  expect(kinds).toEqual(
    expect.arrayContaining([
      'surge',
      'stored-charge',
      'altitude',
      'corrosive-atmosphere',
      'hazardous-voltage',
    ]),
  );
});
