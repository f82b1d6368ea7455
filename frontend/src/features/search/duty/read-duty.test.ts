import { readDutyAddress, writeDuty } from './duty-address';
import { type DutyText, emptyDutyText } from './duty-text';
import { readDuty } from './read-duty';

const typed = (entries: DutyText['entries'], rest: Partial<DutyText> = {}): DutyText => ({
  ...emptyDutyText,
  ...rest,
  entries,
});

describe('reading a duty as it is typed', () => {
  it('turns texts into SI values', () => {
    const { duty } = readDuty(
      typed({
        lower: '4k5',
        upper: '4k9',
        nominal: '4k7',
        voltage: '24',
        ambient: '-20..70',
        life: '10 years',
      }),
    );
    expect(duty).toEqual({
      window: { lower: 4500, upper: 4900, nominal: 4700 },
      load: { voltage: { min: 0, max: 24 } },
      ambient: { min: -20, max: 70 },
      // Ten years of 8760 h.
      life: { hours: 87_600 },
      deviation: 'worst-case',
      approvals: ['approved', 'preferred'],
      supply: ['active'],
    });
  });

  it('takes a nominal with its tolerance as the window: 4.7 kΩ ± 5 % is 4465 to 4935', () => {
    const { duty } = readDuty(typed({ nominal: '4k7 5 %' }));
    expect(duty?.window?.lower).toBeCloseTo(4465, 9);
    expect(duty?.window?.upper).toBeCloseTo(4935, 9);
  });

  it('gives no duty at all while one entry cannot be read', () => {
    const { duty, errors } = readDuty(typed({ lower: '4k5', upper: 'much', voltage: '24' }));
    expect(duty).toBeUndefined();
    expect(Object.keys(errors)).toEqual(['upper']);
  });

  it('asks for the end that is missing', () => {
    expect(readDuty(typed({ lower: '4k5' })).errors.upper).toMatch(/highest/);
    expect(readDuty(typed({ rise: '10' })).errors.ambient).toMatch(/ambient/);
  });

  it('never sends a null', () => {
    const { duty } = readDuty(typed({ length: '3.2 mm' }));
    expect(JSON.stringify(duty)).not.toContain('null');
    expect(duty?.body).toEqual({ length: 0.0032 });
  });

  it('reads pulses and names their errors by place', () => {
    const pulses: DutyText['pulses'] = [
      { shape: 'rectangular', entries: { voltage: '100', duration: '1 ms', period: '1 s' } },
      { shape: 'capacitor-discharge', entries: { voltage: '400', capacitance: 'big' } },
    ];
    const read = readDuty(typed({}, { pulses }));
    expect(read.duty).toBeUndefined();
    expect(read.pulseErrors[0]).toEqual({});
    expect(read.pulseErrors[1]).toHaveProperty('capacitance');
  });
});

describe('a duty in an address', () => {
  it('comes back as it was typed', () => {
    const duty = typed(
      { lower: '4k5', upper: '4k9', ambient: '−20…70' },
      {
        pulses: [{ shape: 'surge-1.2/50', entries: { voltage: '1 kV', count: '10' } }],
        deviation: 'root-sum-square',
        policy: 'none',
        mounting: 'surface',
        features: ['automotive', 'pulse-proof'],
        mains: true,
        secondSource: true,
        approvals: ['approved', 'preferred', 'in-review'],
        supply: [],
      },
    );
    const address = new URLSearchParams();
    writeDuty(duty, address);
    const mailed = new URLSearchParams(address.toString());
    expect(readDutyAddress(mailed)).toEqual({ ...duty, approvals: ['in-review', 'approved', 'preferred'] });
  });

  it('is short for a short duty', () => {
    const address = new URLSearchParams();
    writeDuty(typed({ lower: '4k5', upper: '4k9' }), address);
    expect(address.toString()).toBe('lower=4k5&upper=4k9');
  });

  it('leaves out words it does not know', () => {
    const duty = readDutyAddress(
      new URLSearchParams('mounting=glued&features=automotive,magic&deviation=hope'),
    );
    expect(duty).toMatchObject({ mounting: undefined, features: ['automotive'], deviation: 'worst-case' });
  });
});
