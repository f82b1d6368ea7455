import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readCompanyPartNumbers } from './read-company-part-numbers';

const header = 'number,description,entered_by,entered_on,source_1,source_2,source_3,preferred_on,exception';

describe('company part numbers', () => {
  let folder: string;
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'resistry-test-'));
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  const read = (line: string, first = header): ReturnType<typeof readCompanyPartNumbers> => {
    writeFileSync(join(folder, 'numbers.csv'), `${first}\n${line}\n`);
    return readCompanyPartNumbers(folder, 'numbers.csv');
  };

  it('are read with their sources in order', () => {
    expect(read('BW-R-00417,"4.7 kΩ, 0603",engineer,2025-02-03,TSTA4K7,TSTB4K7,,2025-04-01,')).toEqual([
      {
        number: 'BW-R-00417',
        description: '4.7 kΩ, 0603',
        enteredBy: 'engineer',
        enteredOn: '2025-02-03',
        sources: ['TSTA4K7', 'TSTB4K7'],
        preferredOn: '2025-04-01',
        exception: null,
      },
    ]);
  });

  it.each([
    ['417,x,engineer,2025-02-03,A,,,,', 'numbers.csv, line 2, number: must look like BW-R-00417'],
    ['BW-R-00417,,engineer,2025-02-03,A,,,,', 'line 2, description: is empty'],
    ['BW-R-00417,x,engineer,3.2.2025,A,,,,', 'line 2, entered_on: must be a day'],
    ['BW-R-00417,x,engineer,2025-02-03,,,,,', 'line 2, source_1: is empty'],
    ['BW-R-00417,x,engineer,2025-02-03,A,,,soon,', 'line 2, preferred_on: must be a day'],
    [
      'BW-R-00417,x,engineer,2025-02-03,A,,,2025-04-01,',
      'line 2, exception: must say why one source will do',
    ],
  ])('refuse %s', (line, words) => {
    expect(() => read(line)).toThrow(words);
  });

  it('refuse other columns', () => {
    expect(() => read('a,b', 'number,description')).toThrow(
      'numbers.csv, line 1: must be number,description,',
    );
  });
});
