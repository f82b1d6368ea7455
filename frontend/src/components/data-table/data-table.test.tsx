import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useRef, useState } from 'react';
import { renderInTheme } from '../../test-support/render-in-theme';
import { ColumnChooser } from './column-chooser';
import type { DataColumn, Sort } from './data-column';
import { DataTable } from './data-table';
import { useTableColumns } from './use-table-columns';

interface Line {
  name: string;
  ohm: number;
}

const columns: DataColumn<Line>[] = [
  {
    id: 'name',
    header: 'Part',
    plainHeader: 'Part',
    cell: (line) => line.name,
    plain: (line) => line.name,
    width: 8,
    fixed: true,
  },
  {
    id: 'ohm',
    header: 'Value',
    plainHeader: 'Value, Ω',
    cell: (line) => line.ohm,
    plain: (line) => line.ohm,
    width: 4,
    sortable: true,
  },
];

const rowAt = (index: number): Line => ({ name: `BW-R-${index}`, ohm: index });

function Table({
  onOpen,
  onSort,
}: {
  onOpen: (index: number) => void;
  onSort?: (sort: Sort | undefined) => void;
}) {
  const scrollRef = useRef<HTMLDivElement>(null);
  const [sort, setSort] = useState<Sort>();
  const table = useTableColumns('test', columns, sort, (next) => {
    setSort(next);
    onSort?.(next);
  });
  return (
    <div ref={scrollRef}>
      <ColumnChooser choices={table.choices} />
      <DataTable
        label="Parts"
        columns={table.visible}
        rowCount={10_000}
        rowAt={rowAt}
        sort={sort}
        onSortBy={table.sortBy}
        onOpen={onOpen}
        scrollRef={scrollRef}
      />
    </div>
  );
}

const activeText = (): string | null => {
  const id = screen.getByRole('grid').getAttribute('aria-activedescendant') ?? '';
  return document.getElementById(id)?.textContent ?? null;
};

beforeEach(() => window.localStorage.clear());

describe('the data table', () => {
  it('says how many rows there are and holds only those in sight', () => {
    renderInTheme(<Table onOpen={jest.fn()} />);
    const grid = screen.getByRole('grid', { name: 'Parts' });
    expect(grid).toHaveAttribute('aria-rowcount', '10001');
    expect(within(grid).getAllByRole('row').length).toBeLessThan(60);
  });

  it('is walked by keyboard and opened by Enter', async () => {
    const open = jest.fn();
    renderInTheme(<Table onOpen={open} />);
    screen.getByRole('grid').focus();
    await userEvent.keyboard('{ArrowDown}j{ArrowUp}');
    expect(activeText()).toBe('BW-R-1');
    await userEvent.keyboard('{End}');
    expect(activeText()).toBe('1');
    await userEvent.keyboard('{Enter}');
    expect(open).toHaveBeenCalledWith(1);
  });

  it('asks the server to sort: up, down, and not at all', async () => {
    const sorted = jest.fn();
    renderInTheme(<Table onOpen={jest.fn()} onSort={sorted} />);
    const button = screen.getByRole('button', { name: 'Value' });
    await userEvent.click(button);
    expect(screen.getByRole('columnheader', { name: 'Value' })).toHaveAttribute('aria-sort', 'ascending');
    await userEvent.click(button);
    await userEvent.click(button);
    expect(sorted.mock.calls).toEqual([
      [{ column: 'ohm', descending: false }],
      [{ column: 'ohm', descending: true }],
      [undefined],
    ]);
  });

  it('hides a column and remembers it', async () => {
    const { unmount } = renderInTheme(<Table onOpen={jest.fn()} />);
    await userEvent.click(screen.getByRole('button', { name: 'Columns' }));
    await userEvent.click(screen.getByRole('checkbox', { name: 'Value' }));
    expect(screen.queryByRole('columnheader', { name: 'Value' })).not.toBeInTheDocument();
    unmount();
    renderInTheme(<Table onOpen={jest.fn()} />);
    expect(screen.queryByRole('columnheader', { name: 'Value' })).not.toBeInTheDocument();
  });
});
