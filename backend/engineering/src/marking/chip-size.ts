const metricToInch: ReadonlyMap<string, string> = new Map([
  ['0402', '01005'],
  ['0603', '0201'],
  ['1005', '0402'],
  ['1608', '0603'],
  ['2012', '0805'],
  ['3216', '1206'],
  ['3225', '1210'],
  ['5025', '2010'],
  ['6332', '2512'],
]);

/**
 * The inch code and body length of a chip size. `0603` is the inch code, `1608M` and `0603M` are metric codes,
 * `0603/1608M` names both; 0402 and 0603 exist in both systems, so a bare code is never taken for metric.
 *
 * @returns inch code (null for a metric size without one) and length of the longer side in m; null where the text is no size code
 */
export function chipSize(text: string): { readonly inch: string | null; readonly length: number } | null {
  const [code = ''] = text.trim().split('/');
  const [, metricCode] = /^(\d{4})M$/.exec(code) ?? [];
  if (metricCode !== undefined) {
    const tenths = Math.max(Number(metricCode.slice(0, 2)), Number(metricCode.slice(2)));
    return { inch: metricToInch.get(metricCode) ?? null, length: tenths / 10_000 };
  }
  // 01005 is the one inch code in use with five digits: 0.016 in long.
  if (code === '01005') return { inch: code, length: 0.0004 };
  if (!/^\d{4}$/.test(code)) return null;
  const hundredthsOfInch = Math.max(Number(code.slice(0, 2)), Number(code.slice(2)));
  return { inch: code, length: hundredthsOfInch * 0.000254 };
}
