import { type Difference, differenceWords } from './difference-words';

describe('the words of a difference', () => {
  it.each<[Difference, string]>([
    [{ field: 'tcr', sense: 'worse', own: '100 ppm/K', alternate: '200 ppm/K' }, 'TCR 100 ppm/K → 200 ppm/K'],
    [
      { field: 'ratedDissipation', mode: 'power', sense: 'worse', own: '380 mW', alternate: '250 mW' },
      'rated dissipation 380 mW → 250 mW in the mode “power”',
    ],
    [{ field: 'noiseIndex', sense: 'unknown', alternate: '−30 dB' }, 'noise index not stated → −30 dB'],
    [{ field: 'features', sense: 'worse', own: 'automotive' }, 'without the feature “automotive”'],
    [{ field: 'certificates', sense: 'better', alternate: 'N-1' }, 'with the certificate “N-1”'],
    [{ field: 'pulses', sense: 'different', own: 'stated', alternate: 'stated' }, 'other pulse curves'],
    [{ field: 'pulses', sense: 'unknown', own: 'stated' }, 'pulses stated → not stated'],
  ])('%j: %s', (difference, words) => {
    expect(differenceWords(difference)).toBe(words);
  });
});
