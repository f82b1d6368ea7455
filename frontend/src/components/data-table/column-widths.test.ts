import { columnTracks, leastWidth } from './column-widths';

const columns = [{ width: 4.5 }, { width: 7 }];

describe('the widths of columns', () => {
  it('are at least what each asks, and share in proportion what is left', () => {
    expect(columnTracks(columns)).toBe('minmax(4.5rem, 4.5fr) minmax(7rem, 7fr)');
  });

  it('add up to what the table cannot do without', () => {
    expect(leastWidth(columns)).toBe('11.5rem');
  });
});
