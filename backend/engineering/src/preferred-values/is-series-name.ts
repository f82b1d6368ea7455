import { seriesNames, type SeriesName } from './series';

/** Whether a text names a series of IEC 60063, written as in the standard: E96. */
export function isSeriesName(text: string): text is SeriesName {
  return seriesNames.some((name) => name === text);
}
