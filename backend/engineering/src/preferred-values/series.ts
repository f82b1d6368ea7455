/** The series of preferred values of IEC 60063, coarse to fine. */
export const seriesNames = ['E3', 'E6', 'E12', 'E24', 'E48', 'E96', 'E192'] as const;

export type SeriesName = (typeof seriesNames)[number];
