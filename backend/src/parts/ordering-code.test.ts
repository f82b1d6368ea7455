import { manufacturerPartNumber, orderingCode, OrderingCodeError, type OrderedPart } from './ordering-code';
import { type OrderingCodeTemplate, parseOrderingCodeTemplate } from './ordering-code-template';
import { readOrderingCode } from './read-ordering-code';

const chip: OrderedPart = {
  familyCode: 'TSTA',
  sizeCode: '0603',
  resistance: 4700,
  tolerance: 0.01,
  tcr: 100e-6,
};
const link: OrderedPart = { ...chip, resistance: 0, tolerance: null, tcr: null };

function template(text: string): OrderingCodeTemplate {
  const parsed = parseOrderingCodeTemplate(text);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.template;
}

function refusal(text: string): string {
  const parsed = parseOrderingCodeTemplate(text);
  return parsed.ok ? 'accepted' : parsed.message;
}

describe('an ordering code is made from its template', () => {
  // Letters of tolerance, TCR and resistance: IEC 60062 (references.md, Marking).
  it.each([
    ['{family}{size}{tolerance}{resistance:four}', 'TSTA0603F4701'],
    ['{family}-{size}-{resistance:rkm}{tolerance}', 'TSTA-0603-4K7F'],
    ['{family}{size}{tcr}{resistance:three}', 'TSTA0603S472'],
    ['{family}{size}{tcr:ppm}{resistance:three}', 'TSTA0603100472'],
    ['{family}{size}{tolerance:1=Q,5=W}{tcr:100=k,200=m}{resistance:rkm}', 'TSTA0603Qk4K7'],
  ])('%s', (text, code) => {
    expect(manufacturerPartNumber(template(text), chip)).toBe(code);
  });

  it('has the packaging and what belongs to it only when the packaging is given', () => {
    const bracketed = template('{family}{size}{resistance:rkm}[-{packaging}/]');
    expect(orderingCode(bracketed, { ...chip, packagingCode: 'T5' })).toBe('TSTA06034K7-T5/');
    expect(orderingCode(bracketed, chip)).toBe('TSTA06034K7');
    const plain = template('{family}{size}{packaging}{resistance:rkm}');
    expect(orderingCode(plain, { ...chip, packagingCode: 'T' })).toBe('TSTA0603T4K7');
    expect(manufacturerPartNumber(plain, chip)).toBe('TSTA06034K7');
  });

  it('writes noughts for a link', () => {
    expect(
      manufacturerPartNumber(template('{family}{size}{tolerance}{tcr:ppm}{resistance:four}'), link),
    ).toBe('TSTA060300000000');
    expect(manufacturerPartNumber(template('{size}{tolerance}{tcr}{resistance:three}'), link)).toBe(
      '060300000',
    );
    expect(manufacturerPartNumber(template('{size}{resistance:rkm}'), link)).toBe('06030R0');
  });

  it.each([
    [50, '050'],
    [5, '005'],
    [0.2, 'R20'],
    [2.5, '2R5'],
  ])('writes %s ppm/K in three characters', (partsPerMillion, text) => {
    const ppm = template('{resistance:rkm}{tcr:ppm}');
    expect(manufacturerPartNumber(ppm, { ...chip, tcr: partsPerMillion * 1e-6 })).toBe(`4K7${text}`);
  });

  it.each([
    ['{resistance:three}', { resistance: 4750 }, '4750 Ω'],
    ['{tolerance}{resistance:four}', { tolerance: 0.03 }, 'tolerance of 3 %'],
    ['{tolerance:1=Q}{resistance:four}', { tolerance: 0.05 }, 'tolerance of 5 %'],
    ['{tcr}{resistance:four}', { tcr: 75e-6 }, '75 ppm/K'],
    ['{tcr:100=S}{resistance:four}', { tcr: 50e-6 }, '50 ppm/K'],
    ['{tcr}{resistance:four}', { tcr: null }, 'temperature coefficient'],
    ['{tolerance}{resistance:four}', { tolerance: null }, 'tolerance'],
  ])('%s refuses what it cannot write', (text, changes, words) => {
    const write = (): string => manufacturerPartNumber(template(text), { ...chip, ...changes });
    expect(write).toThrow(OrderingCodeError);
    expect(write).toThrow(words);
  });
});

describe('a template that cannot be used is refused with the reason', () => {
  it.each([
    ['{family}{colour}{resistance:rkm}', '{colour} is not known'],
    ['{family}{resistance}', '{resistance} is not known'],
    ['{family}{resistance:five}', '{resistance:five} is not known'],
    ['{family}{size}', 'Without {resistance:…}'],
    ['{size}{size}{resistance:rkm}', '{size} stands 2 times'],
    ['{resistance:rkm}[-{size}]', 'must hold {packaging}'],
    ['{resistance:rkm} {packaging}', 'cannot be read from “ {packaging}” on'],
    ['{resistance:rkm', 'cannot be read from “{resistance:rkm” on'],
    ['{tolerance:1=F,1=G}{resistance:rkm}', '1 stands twice'],
    ['{tolerance:1=F,2=F}{resistance:rkm}', 'F stands for two values'],
    ['{tcr:100}{resistance:rkm}', '“100” must look like 100=S'],
  ])('%s', (text, words) => {
    expect(refusal(text)).toContain(words);
  });
});

describe('an ordering code is read back by its template', () => {
  const vocabulary = { familyCode: 'TSTA', sizeCodes: ['0603', '06'], packagingCodes: ['R', 'RL'] };

  it.each([
    ['{family}{size}-{tolerance}{resistance:rkm}{packaging}', 'TSTA0603-F10RRL'],
    ['{family}{size}-{resistance:rkm}{tolerance}[/{packaging}]', 'TSTA0603-10RF/RL'],
  ])('%s reads %s', (text, code) => {
    expect(readOrderingCode(template(text), code, vocabulary)).toEqual({
      sizeCode: '0603',
      resistance: 10,
      tolerance: 0.01,
      tcr: null,
      packagingCode: 'RL',
    });
  });

  it('gives back what went in', () => {
    const full = template('{family}{size}{tolerance:1=H}{tcr:ppm}-{resistance:four}');
    for (const tcr of [100e-6, 2e-6, 0.2e-6]) {
      const code = manufacturerPartNumber(full, { ...chip, tcr });
      expect(readOrderingCode(full, code, vocabulary)).toMatchObject({
        resistance: 4700,
        tolerance: 0.01,
        tcr,
      });
    }
    const code = manufacturerPartNumber(full, link);
    expect(readOrderingCode(full, code, vocabulary)).toMatchObject({
      resistance: 0,
      tolerance: null,
      tcr: null,
    });
  });

  it('says nothing of a letter that stands for two temperature coefficients', () => {
    // Z: 20 and 10 ppm/K (IEC 60062).
    const letters = template('{resistance:rkm}{tcr}');
    expect(readOrderingCode(letters, '4K7Z', vocabulary)?.tcr).toBeNull();
    expect(readOrderingCode(letters, '4K7S', vocabulary)?.tcr).toBe(100e-6);
  });

  it.each(['TSTA0603F4701', 'TSTB0603-F4K7', 'TSTA0805-F4K7', 'TSTA0603-F4K7X', 'TSTA0603-FKK', ''])(
    'does not read “%s”',
    (text) => {
      const plain = template('{family}{size}-{tolerance}{resistance:rkm}{packaging}');
      expect(readOrderingCode(plain, text, vocabulary)).toBeNull();
    },
  );
});
