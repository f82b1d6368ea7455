/** Letters of IEC 60062 for temperature coefficients, 1/K. Z stands for 20 ppm/K and for 10 ppm/K. */
export const tcrLetters: readonly { readonly letter: string; readonly tcr: number }[] = [
  { letter: 'U', tcr: 250e-6 },
  { letter: 'S', tcr: 100e-6 },
  { letter: 'R', tcr: 50e-6 },
  { letter: 'P', tcr: 15e-6 },
  { letter: 'Q', tcr: 25e-6 },
  { letter: 'Z', tcr: 20e-6 },
  { letter: 'Z', tcr: 10e-6 },
  { letter: 'M', tcr: 5e-6 },
  { letter: 'K', tcr: 1e-6 },
];
