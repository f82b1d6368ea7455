import { priceEcho, readPrices, writePrices } from './price-lines';

describe('prices, one a line', () => {
  it.each<[string, { quantity: number; unitPrice: number }[]]>([
    ['100 0.0092', [{ quantity: 100, unitPrice: 0.0092 }]],
    ['100: 0,0092', [{ quantity: 100, unitPrice: 0.0092 }]],
    ['100\t€0.0092', [{ quantity: 100, unitPrice: 0.0092 }]],
    [
      ' 1 12 \n\n 1000 0.000001\n',
      [
        { quantity: 1, unitPrice: 12 },
        { quantity: 1000, unitPrice: 0.000001 },
      ],
    ],
  ])('%j is understood, and written back so that it is understood again', (text, breaks) => {
    expect(readPrices(text)).toEqual({ ok: true, breaks });
    expect(readPrices(writePrices(breaks))).toEqual({ ok: true, breaks });
  });

  it.each([
    '',
    ' \n ',
    '100',
    '0 1',
    '1.5 1',
    '1,000 1',
    '1k 1',
    '100 0',
    '100 -1',
    '100 1e3',
    '100 0.0000001',
    '1 2 3',
  ])('%j is refused, naming the line', (text) => {
    expect(readPrices(text)).toMatchObject({ ok: false });
    expect(priceEcho(text)).toBeUndefined();
  });

  it('are echoed with what they mean', () => {
    expect(priceEcho('1000 0.0069\n100 0,01')).toBe('from 1,000: € 0.0069; from 100: € 0.01');
  });
});
