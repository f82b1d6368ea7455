import type { DataColumn } from './data-column';
import { commaSeparated, tabSeparated } from './delimited-text';

interface Line {
  name: string;
  ohm: number | null;
}

const column = (id: 'name' | 'ohm', plainHeader: string): DataColumn<Line> => ({
  id,
  header: plainHeader,
  plainHeader,
  cell: () => null,
  plain: (line) => line[id],
  width: 1,
});

const columns = [column('name', 'Part'), column('ohm', 'Resistance, Ω')];

describe('rows as text', () => {
  it('quotes what RFC 4180 asks to quote and leaves an absent number empty', () => {
    const rows = [
      { name: 'QLM "A", 0204', ohm: 4700 },
      { name: 'plain', ohm: null },
    ];
    expect(commaSeparated(columns, rows)).toBe(
      'Part,"Resistance, Ω"\r\n"QLM ""A"", 0204",4700\r\nplain,\r\n',
    );
  });

  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\tx'])('makes %j a text and no formula', (name) => {
    expect(commaSeparated(columns, [{ name, ohm: 1 }])).toContain(`'${name}`);
  });

  it('never breaks a line or a column of the clipboard', () => {
    expect(tabSeparated(columns, [{ name: 'a\tb\nc', ohm: 1 }])).toBe('Part\tResistance, Ω\na b c\t1');
  });
});
