import { chakra } from '@chakra-ui/react';

export interface NumbersTableProps {
  caption: string;
  headers: readonly string[];
  rows: readonly (readonly string[])[];
}

const Table = chakra('table', {
  base: {
    fontSize: 'xs',
    borderCollapse: 'collapse',
    '& caption': { textAlign: 'start', color: 'fg.muted', whiteSpace: 'nowrap' },
    '& th, & td': { textAlign: 'end', pe: 4, py: 0.5, borderBottom: '1px solid', borderColor: 'border' },
    '& th': { color: 'fg.muted', fontWeight: 'semibold' },
  },
});

/** The numbers of a chart, for those who would rather read than look. */
export function NumbersTable({ caption, headers, rows }: NumbersTableProps) {
  return (
    <chakra.details fontSize="xs" mt={1}>
      <chakra.summary color="fg.muted" cursor="pointer" py={1}>
        As numbers
      </chakra.summary>
      <Table>
        <caption>{caption}</caption>
        <thead>
          <tr>
            {headers.map((header) => (
              <th key={header} scope="col">
                {header}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.join(' ')}>
              {row.map((cell, index) => (
                <td key={headers[index]}>{cell}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </Table>
    </chakra.details>
  );
}
