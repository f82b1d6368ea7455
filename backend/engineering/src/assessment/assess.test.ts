import type { CheckName } from '../checks/check';
import { criticalResistance } from '../checks/voltage';
import type { Policy } from '../derating/policy-entry';
import type { Duty } from '../duty/duty';
import { requirementOf } from '../duty/requirement';
import type { Ratings } from '../ratings/ratings';
import { gentleDuty, thickFilmChip, twoThirds } from '../test-support/thick-film-chip';
import { thermalResistanceOf } from '../thermal/thermal-resistance';
import { assess, type Assessment, type CheckResult } from './assess';

const assessed = (ratings: Ratings, duty: Duty, policy: Policy = 'none'): Assessment =>
  assess({ modes: [{ ratings }] }, requirementOf(duty), policy);
const check = (assessment: Assessment, name: CheckName): CheckResult | undefined =>
  assessment.checks.find((candidate) => candidate.check === name);
const without = (ratings: Ratings, ...fields: (keyof Ratings)[]): Ratings =>
  Object.fromEntries(
    Object.entries(ratings).filter(([name]) => !fields.includes(name as keyof Ratings)),
  ) as unknown as Ratings;

describe('rated and critical voltage (IEC 60115-1)', () => {
  it('½ W derated to 50 % at 1 MΩ bears 500 V (NAVSEA SD-18)', () => {
    const halfWatt: Ratings = {
      ...thickFilmChip,
      resistance: 1e6,
      ratedDissipation: 0.5,
      limitingElementVoltage: 1000,
    };
    const half = { match: {}, powerRatio: 0.5, reading: 'multiplied', voltageRatio: 1 } as const;
    expect(
      assessed(halfWatt, { ambient: { min: 20, max: 70 } }, { entries: [half] }).permitted.voltage,
    ).toBeCloseTo(500, 9);
  });

  it('critical resistance is U²/P70: 200 V and 0.25 W give 160 kΩ', () => {
    expect(criticalResistance(200, 0.25)).toBe(160_000); // arithmetic: 40 000 / 0.25
  });

  it('below the critical resistance the dissipation bounds the voltage, above it the limiting element voltage', () => {
    const cold: Duty = { ambient: { min: 20, max: 20 } };
    expect(assessed({ ...thickFilmChip, resistance: 1e4 }, cold).permitted.voltage).toBeCloseTo(50, 9); // √(0.25·10⁴)
    expect(assessed({ ...thickFilmChip, resistance: 1e6 }, cold).permitted.voltage).toBe(200);
  });
});

describe('deviation budget', () => {
  it('50 ppm/K over 60 K is 0.30 % (references.md)', () => {
    const part: Ratings = { ...thickFilmChip, tcr: 50e-6, tolerance: 0 };
    const line = assessed(part, {
      ...gentleDuty,
      load: undefined,
      ambient: { min: 20, max: 80 },
    }).budget.find((entry) => entry.contribution === 'temperature');
    expect(line?.amount).toBeCloseTo(0.003, 12);
  });

  it('takes the cold end where it is farther from 20 °C, without self-heating', () => {
    // arithmetic: cold 20 − (−55) = 75 K; hot 40 + 340 K/W · P − 20 with P ≈ 12²/4700 = 0.031 W: 30 K
    const result = assessed(thickFilmChip, {
      ...gentleDuty,
      load: { voltage: { min: 0, max: 12 } },
      ambient: { min: -55, max: 40 },
    });
    expect(result.budget.find((entry) => entry.contribution === 'temperature')?.amount).toBeCloseTo(
      75e-4,
      10,
    );
  });

  it('film drift: 0.25 % at 125 °C and 1000 h becomes 0.5 % at 8000 h and 1.52 % at 225 000 h (references.md)', () => {
    const film: Ratings = {
      ...thickFilmChip,
      technology: 'thin-film',
      tcr: 0,
      drift: { fraction: 0.0025, hours: 1000, temperature: 125 },
    };
    const drift = (hours: number): number =>
      assessed(film, {
        window: { lower: 4000, upper: 5400 },
        ambient: { min: 20, max: 125 },
        life: { hours },
      }).budget.find((entry) => entry.contribution === 'drift')?.amount ?? NaN;
    expect(drift(8000)).toBeCloseTo(0.005, 9);
    expect(drift(225_000)).toBeCloseTo(0.0152, 4);
  });

  it('other technologies never go below their figure and are unrated beyond its hours or temperature', () => {
    const part: Ratings = { ...thickFilmChip, drift: { fraction: 0.01, hours: 1000, temperature: 155 } };
    const duty = (hours: number): Duty => ({
      window: { lower: 4000, upper: 5400 },
      ambient: { min: 20, max: 40 },
      life: { hours },
    });
    expect(assessed(part, duty(10)).budget.find((line) => line.contribution === 'drift')?.amount).toBe(0.01);
    const beyond = check(assessed(part, duty(1001)), 'value');
    expect(beyond).toMatchObject({ status: 'unrated', margin: null });
    expect(beyond?.missing.join()).toContain('1000 h');
  });

  it('lists a missing contribution with null, never 0, and has no total line', () => {
    const budget = assessed(thickFilmChip, gentleDuty).budget;
    expect(budget.find((line) => line.contribution === 'humidity')).toMatchObject({
      amount: null,
      missing: ['humidityShift'],
    });
    expect(budget.map((line) => line.contribution)).toEqual([
      'tolerance',
      'temperature',
      'voltage',
      'soldering',
      'humidity',
      'drift',
    ]);
  });

  it('adds worst case or as root-sum-square', () => {
    const part: Ratings = { ...without(thickFilmChip, 'drift'), tolerance: 0.03, tcr: 0, solderShift: 0.04 };
    const duty: Duty = { window: { lower: 4000, upper: 5400 } };
    expect(check(assessed(part, duty), 'value')?.demand).toBeCloseTo(0.07, 12);
    expect(check(assessed(part, { ...duty, deviation: 'root-sum-square' }), 'value')?.demand).toBeCloseTo(
      0.05,
      12,
    ); // 3-4-5
  });
});

describe('self-heating', () => {
  it('settles T = T_a + R_th·I²·R₀(1+α(T−T₀)) at its closed form', () => {
    // Linear in T, so T = [T_a + k(1 − αT₀)] / (1 − kα) with k = R_th·I²·R₀; tolerance and drift 0 leave only the TCR.
    const part: Ratings = {
      ...without(thickFilmChip, 'drift'),
      resistance: 1000,
      tolerance: 0,
      tcr: 500e-6,
      thermalResistance: 300,
    };
    const current = 0.012;
    const k = 300 * current ** 2 * 1000;
    const closed = (60 + k * (1 - 500e-6 * 20)) / (1 - k * 500e-6);
    const result = assessed(part, {
      load: { current: { min: 0, max: current } },
      ambient: { min: 20, max: 60 },
    });
    expect(check(result, 'element-temperature')?.demand).toBeCloseTo(closed, 8);
  });

  it('without an operating point is unmet, with no number that looks like an answer', () => {
    const part: Ratings = {
      ...without(thickFilmChip, 'drift'),
      resistance: 1000,
      tcr: 5000e-6,
      thermalResistance: 300,
    };
    const result = assessed(part, {
      window: { lower: 1, upper: 1e6 },
      load: { current: { min: 0, max: 0.1 } },
      ambient: { min: 20, max: 60 },
    });
    expect(check(result, 'dissipation')).toMatchObject({ status: 'unmet', demand: null, margin: null });
    expect(check(result, 'value')).toMatchObject({ status: 'unmet', demand: null });
    expect(result.budget.find((line) => line.contribution === 'temperature')?.amount).toBeNull();
  });

  it('takes R_th from the slope of the curve, (155 − 70) K / 0.25 W = 340 K/W, and 0 K/W as a value', () => {
    expect(thermalResistanceOf(thickFilmChip)).toEqual({ value: 340, from: 'derating curve' });
    expect(thermalResistanceOf({ ...thickFilmChip, thermalResistance: 0 })).toEqual({
      value: 0,
      from: 'datasheet',
    });
  });
});

describe('dissipation', () => {
  it('uses the worst resistance over life: 24 V across 4.7 kΩ ±1 %, policy two thirds at 70 °C', () => {
    const result = assessed(
      without(thickFilmChip, 'drift'),
      { ...gentleDuty, life: undefined },
      { entries: [twoThirds] },
    );
    const line = check(result, 'dissipation');
    const low = result.operating?.low ?? NaN;
    expect(line?.demand).toBeCloseTo(576 / low, 12);
    expect(line?.allowance).toBeCloseTo(0.25 * 0.67, 12);
    // arithmetic: P ≈ 0.1247 W, T ≈ 112.4 °C, TCR 92.4 K · 100 ppm = 0.92 %, R_low ≈ 4700·(1 − 0.0192)
    expect(low).toBeCloseTo(4700 * (1 - 0.01 - 100e-6 * (50 + 340 * (576 / low))), 6);
  });

  it('says what the interval of the resistance lacks, so that a worst case of less does not look like the whole', () => {
    const notes = check(assessed(without(thickFilmChip, 'drift'), gentleDuty), 'dissipation')?.basis.notes;
    expect(notes?.join()).toContain('voltage, soldering, humidity, drift');
  });

  it('is unrated where the axis temperature is missing, never replaced by another', () => {
    const terminal: Ratings = {
      ...thickFilmChip,
      derating: {
        axis: 'terminal',
        points: [
          [100, 1],
          [155, 0],
        ],
      },
    };
    expect(check(assessed(terminal, gentleDuty), 'dissipation')).toMatchObject({
      status: 'unrated',
      missing: ['ambient.terminal'],
    });
  });

  it('without an ambient is unrated and names it', () => {
    expect(
      check(assessed(thickFilmChip, { load: { voltage: { min: 0, max: 1 } } }), 'dissipation'),
    ).toMatchObject({ status: 'unrated', missing: ['ambient'] });
  });

  it('with pulses is unrated until their heat is computed, but unmet where the steady load alone is too much', () => {
    const pulses = [{ shape: 'rectangular', voltage: 5, duration: 1e-3 }] as const;
    expect(check(assessed(thickFilmChip, { ...gentleDuty, pulses }), 'dissipation')?.status).toBe('unrated');
    expect(
      check(assessed(thickFilmChip, { ...gentleDuty, load: { power: { max: 5 } }, pulses }), 'dissipation')
        ?.status,
    ).toBe('unmet');
    expect(check(assessed(thickFilmChip, { ...gentleDuty, pulses }), 'single-pulse')?.status).toBe('unrated');
  });

  it('no matching policy entry is unrated', () => {
    const policy: Policy = { entries: [{ ...twoThirds, match: { technology: 'wirewound' } }] };
    expect(check(assessed(thickFilmChip, gentleDuty, policy), 'dissipation')?.status).toBe('unrated');
    expect(check(assessed(thickFilmChip, gentleDuty, policy), 'voltage')?.status).toBe('unrated');
  });
});

describe('yes-or-no checks and links', () => {
  it('leaves out what the duty does not ask', () => {
    expect(assessed(thickFilmChip, {}).checks).toEqual([]);
  });

  it('holds body, mounting, features, certificate', () => {
    const duty: Duty = {
      body: { length: 0.003 },
      mounting: 'surface',
      features: ['automotive'],
      safety: { mains: true },
    };
    const result = assessed(thickFilmChip, duty);
    expect(Object.fromEntries(result.checks.map((line) => [line.check, line.status]))).toEqual({
      body: 'unmet',
      mounting: 'met',
      features: 'unmet',
      certificate: 'unrated',
    });
    expect(result.cautions.map((caution) => caution.kind)).toContain('certified-type');
  });

  it('a window from 0 asks for a link, and only a link meets it', () => {
    const link: Ratings = {
      technology: 'thick-film',
      resistance: 0,
      link: { ratedCurrent: 1, residualResistance: 0.05 },
    };
    const duty: Duty = { window: { lower: 0, upper: 0.05 }, load: { current: { min: 0, max: 0.8 } } };
    expect(assessed(link, duty).checks.map((line) => [line.check, line.status])).toEqual([
      ['value', 'met'],
      ['link-current', 'met'],
      ['link-resistance', 'met'],
    ]);
    expect(check(assessed(thickFilmChip, duty), 'value')?.status).toBe('unmet');
    expect(check(assessed(link, { window: { lower: 10, upper: 20 } }), 'value')?.status).toBe('unmet');
  });

  it('never mixes operating modes: the mode of the best verdict stands', () => {
    const hotMode: Ratings = {
      ...thickFilmChip,
      ratedDissipation: 0.5,
      drift: { fraction: 0.05, hours: 87600, temperature: 155 },
    };
    const duty: Duty = {
      ...gentleDuty,
      window: { lower: 4200, upper: 5200 },
      load: { voltage: { min: 0, max: 36 } },
    };
    const modes = [
      { name: 'standard', ratings: thickFilmChip },
      { name: 'power', ratings: hotMode },
    ];
    expect(assess({ modes }, requirementOf(duty), 'none').mode).toBe('power');
    expect(assess({ modes }, requirementOf(gentleDuty), 'none').mode).toBe('standard');
  });
});
