import { bodyMarking, type BodyMarking, type MarkedBody } from './body-marking';
import { chipSize } from './chip-size';

const part = { resistance: 4700, tolerance: 0.05, tcr: 100e-6, isLink: false } as const;

function shown(body: MarkedBody): string {
  const marking: BodyMarking = bodyMarking(body);
  if (marking.kind === 'characters') return marking.text;
  if (marking.kind === 'bands') return marking.bands.join(' ');
  return marking.kind;
}

describe('bodyMarking', () => {
  // Chips, IEC 60062: last digit = noughts, R = point; 0402 and smaller bear none.
  it.each([
    ['0805', 4700, 0.05, '472'],
    ['0805', 4700, 0.01, '4701'],
    ['0805', 4990, 0.01, '4991'],
    ['0603', 4700, 0.05, '472'],
    ['0603', 4990, 0.01, '68B'],
    ['0603', 4700, 0.01, '472'],
    ['0603', 4990, 0.001, '4991'],
    ['0603/1608M', 4990, 0.01, '68B'],
    ['1608M', 4990, 0.01, '68B'],
    ['2512', 0.005, 0.01, 'R005'],
    ['2512', 0.0005, 0.01, 'L50'],
    ['0402', 4700, 0.05, 'none'],
    ['0402/1005M', 4700, 0.01, 'none'],
    ['1005M', 4700, 0.01, 'none'],
    ['0603M', 4700, 0.01, 'none'],
    ['0201', 4700, 0.01, 'none'],
    ['01005', 4700, 0.01, 'none'],
    ['big', 4700, 0.01, 'unknown'],
  ])('chip %s, %d Ω, %d: %s', (size, resistance, tolerance, expected) => {
    expect(shown({ ...part, style: 'chip', size, resistance, tolerance })).toBe(expected);
  });

  it.each([
    [4700, 0.05, 100e-6, 'yellow violet red gold'],
    [4700, 0.1, undefined, 'yellow violet red silver'],
    [4700, 0.2, undefined, 'yellow violet red'],
    [4700, 0.01, 100e-6, 'yellow violet black brown brown'],
    [4700, 0.01, 50e-6, 'yellow violet black brown brown red'],
    [4700, 0.01, 75e-6, 'yellow violet black brown brown'],
    [4990, 0.001, 15e-6, 'yellow white white brown violet orange'],
    [0.22, 0.05, undefined, 'red red silver gold'],
    [4700, 0.00005, 1e-6, '4K7E'],
    [0.001, 0.01, undefined, '1L0F'],
  ])('axial and MELF %d Ω, %d, %d: %s', (resistance, tolerance, tcr, expected) => {
    expect(shown({ ...part, style: 'axial', size: '0207', resistance, tolerance, tcr })).toBe(expected);
    expect(shown({ ...part, style: 'melf', size: '0204', resistance, tolerance, tcr })).toBe(expected);
  });

  it('printed bodies bear the letter code', () => {
    expect(shown({ ...part, style: 'printed', size: '25 W' })).toBe('4K7J');
  });

  it('links bear noughts or a single black band', () => {
    const link = { resistance: 0, isLink: true };
    expect(shown({ ...link, style: 'chip', size: '0603' })).toBe('0');
    expect(shown({ ...link, style: 'chip', size: '0805' })).toBe('000');
    expect(shown({ ...link, style: 'chip', size: '0402' })).toBe('none');
    expect(shown({ ...link, style: 'axial', size: '0207' })).toBe('black');
    expect(shown({ ...link, style: 'melf', size: '0204' })).toBe('black');
  });

  it('says that it cannot tell without a tolerance or a value', () => {
    expect(bodyMarking({ ...part, tolerance: undefined, style: 'axial', size: '0207' })).toEqual({
      kind: 'unknown',
      reason: 'The marking cannot be told: the tolerance is missing.',
    });
    expect(shown({ ...part, tolerance: undefined, style: 'chip', size: '0805' })).toBe('unknown');
    expect(shown({ ...part, resistance: 0, style: 'chip', size: '0805' })).toBe('unknown');
    expect(shown({ ...part, resistance: NaN, style: 'axial', size: '0207' })).toBe('unknown');
  });
});

describe('chipSize', () => {
  it('tells inch from metric 0402 and 0603', () => {
    expect(chipSize('0603')?.length).toBeCloseTo(0.001524, 9);
    expect(chipSize('0603M')).toEqual({ inch: '0201', length: 0.0006 });
    expect(chipSize('0402M')).toEqual({ inch: '01005', length: 0.0004 });
    expect(chipSize('0612')?.length).toBeCloseTo(0.003048, 9);
    expect(chipSize('MELF')).toBeNull();
    expect(chipSize('')).toBeNull();
  });
});
