import { type DutyText, emptyDutyText } from '../duty/duty-text';
import { readyRelaxations } from './relaxation-words';

const duty: DutyText = { ...emptyDutyText, entries: { upper: '4k9', voltage: '0…24', life: '10 years' } };

describe('relaxations as they are offered', () => {
  it('are said in the words of the entry, which they change', () => {
    const [offer] = readyRelaxations([{ field: '/load/voltage/max', to: 11.1, gains: 3 }], duty);
    expect(offer?.words).toBe('11.1 V voltage');
    expect(offer?.relaxed(duty).entries.voltage).toBe('0…11.1 V');
  });

  it.each([
    ['that leave no load at all', { field: '/load/voltage/max', to: 0, gains: 1 }],
    ['that bring nothing', { field: '/window/upper', to: 5000, gains: 0 }],
    ['of what the duty has no entry for', { field: '/pulses/0/power', to: 2, gains: 4 }],
  ])('are left out where they are those %s', (_which, relaxation) => {
    expect(readyRelaxations([relaxation], duty)).toEqual([]);
  });
});
