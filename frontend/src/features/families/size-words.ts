/** Inch and metric code, both, because 0402 and 0603 name two sizes each. */
export const sizeWords = (size: { code: string; metricCode?: string }): string =>
  size.metricCode === undefined ? size.code : `${size.code}/${size.metricCode}`;
