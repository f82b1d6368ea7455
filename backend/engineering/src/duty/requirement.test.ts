import type { Duty } from './duty';
import { DutyConflict } from './duty-conflict';
import { impliedQuantities, requirementOf } from './requirement';

const implied = (duty: Duty): ReturnType<typeof impliedQuantities> => impliedQuantities(requirementOf(duty));
const pointersOf = (duty: Duty): string[] => {
  try {
    requirementOf(duty);
  } catch (error) {
    if (error instanceof DutyConflict) return error.conflicts.flatMap((conflict) => conflict.pointers);
    throw error;
  }
  return [];
};

describe('limits', () => {
  it('give lower = U_max/I_max and upper = U_min/I_min, and the load', () => {
    // arithmetic: 12 V / 10 mA = 1200 Ω; 10 V / 5 mA = 2000 Ω; worst dissipation 12 V · 10 mA = 0.12 W
    const quantities = implied({
      limits: { voltage: { min: 10, max: 12 }, current: { min: 0.005, max: 0.01 } },
    });
    expect(quantities.window).toEqual({ lower: 1200, upper: 2000 });
    expect(quantities.voltage?.max).toBe(12);
    expect(quantities.dissipation).toBeCloseTo(0.12, 12);
  });

  it('that leave nothing name both sides and say what would make them possible', () => {
    const empty: Duty = { limits: { voltage: { min: 5, max: 12 }, current: { min: 0.005, max: 0.01 } } };
    expect(pointersOf(empty)).toEqual(['/limits/voltage', '/limits/current']);
    // arithmetic: I_max·U_min/U_max = 10 mA · 5/12 = 4.1667 mA; U_max·I_min/U_min = 12 mA
    expect(() => requirementOf(empty)).toThrow(/4\.16.*mA.*12 mA/s);
  });

  it('with a smallest current of 0 bound the window only from below', () => {
    expect(
      implied({ limits: { voltage: { min: 5, max: 12 }, current: { min: 0, max: 0.01 } } }).window,
    ).toEqual({ lower: 1200, upper: undefined });
  });
});

describe('any two of voltage, current, resistance and power', () => {
  it('24 V, 10 mA at 4.7 kΩ: the least of U²/R, I²R and U·I', () => {
    // arithmetic: 24²/4700 = 0.12255 W; 0.01²·4700 = 0.47 W; 24·0.01 = 0.24 W
    const quantities = implied({
      window: { lower: 4700, upper: 4700 },
      load: { voltage: { min: 0, max: 24 }, current: { min: 0, max: 0.01 } },
    });
    expect(quantities.dissipation).toBeCloseTo(576 / 4700, 12);
    expect(quantities.voltage?.max).toBe(24);
    expect(quantities.current?.max).toBeCloseTo(24 / 4700, 12);
  });

  it('has its largest dissipation inside the window where U/I lies inside', () => {
    // arithmetic: U/I = 2400 Ω lies in 1…10 kΩ, so 24 V · 10 mA = 0.24 W, more than at either end
    const load = { voltage: { min: 0, max: 24 }, current: { min: 0, max: 0.01 } };
    expect(implied({ window: { lower: 1000, upper: 10000 }, load }).dissipation).toBeCloseTo(0.24, 12);
  });

  it('a power and a window give √(P·R) and √(P/R)', () => {
    const quantities = implied({ window: { lower: 100, upper: 400 }, load: { power: { max: 1 } } });
    expect(quantities).toMatchObject({ voltage: { max: 20 }, current: { max: 0.1 }, dissipation: 1 });
  });

  it('exact voltage and current without a window give the resistance', () => {
    const quantities = implied({ load: { voltage: { min: 5, max: 5 }, current: { min: 0.01, max: 0.01 } } });
    expect(quantities.window).toEqual({ lower: 500, upper: 500 });
    expect(quantities.dissipation).toBeCloseTo(0.05, 12);
  });

  it('counts the larger magnitude of a signed load', () => {
    expect(
      implied({ window: { lower: 100, upper: 100 }, load: { voltage: { min: -10, max: 5 } } }).dissipation,
    ).toBeCloseTo(1, 12);
  });

  it('leaves out what nothing bounds', () => {
    const quantities = implied({ load: { voltage: { min: 0, max: 24 } } });
    expect(quantities.dissipation).toBeUndefined();
    expect(quantities.current?.max).toBeUndefined();
  });
});

describe('contradictions name the fields that clash', () => {
  it.each<[string, Duty, string[]]>([
    ['window upside down', { window: { lower: 5, upper: 4 } }, ['/window/lower', '/window/upper']],
    ['nominal outside', { window: { lower: 4, upper: 5, nominal: 6 } }, ['/window/nominal', '/window/upper']],
    [
      'window and limits',
      {
        window: { lower: 1, upper: 2 },
        limits: { voltage: { min: 1, max: 1 }, current: { min: 1, max: 1 } },
      },
      ['/window', '/limits'],
    ],
    ['negative resistance', { window: { lower: -1, upper: 2 } }, ['/window/lower']],
    ['ambient upside down', { ambient: { min: 70, max: -20 } }, ['/ambient/min', '/ambient/max']],
    ['below absolute zero', { ambient: { min: -300, max: 20 } }, ['/ambient/min']],
    ['no life', { life: { hours: 0 } }, ['/life/hours']],
    [
      'voltage too high for the current',
      {
        window: { lower: 100, upper: 1000 },
        load: { voltage: { min: 24, max: 24 }, current: { min: 0, max: 0.01 } },
      },
      ['/load/voltage/min', '/load/current/max', '/window/upper'],
    ],
    ['noise band from 0', { noise: { from: 0, to: 10, limit: 1 } }, ['/noise/from']],
    ['nothing allowed', { approvals: [] }, ['/approvals']],
    ['infinite', { life: { hours: Infinity } }, ['/life/hours']],
    ['not a number', { window: { lower: NaN, upper: 2 } }, ['/window/lower']],
  ])('%s', (_name, duty, pointers) => {
    expect(pointersOf(duty)).toEqual(pointers);
  });

  it('null is refused wherever it stands', () => {
    expect(pointersOf({ ambient: null } as unknown as Duty)).toEqual(['/ambient']);
  });

  it('a load that some resistance inside the window can bear is no conflict', () => {
    expect(
      pointersOf({
        window: { lower: 2000, upper: 10000 },
        load: { voltage: { min: 24, max: 24 }, current: { min: 0, max: 0.01 } },
      }),
    ).toEqual([]);
  });
});
