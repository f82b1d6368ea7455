import { chakra } from '@chakra-ui/react';
import { useRef, useState } from 'react';
import { problemOf } from '../../../api/problem';
import { Button } from '../../../components/button';
import type { DataColumn } from '../../../components/data-table/data-column';
import { commaSeparated, tabSeparated } from '../../../components/data-table/delimited-text';
import { saveText } from '../../../components/data-table/save-text';
import type { SearchItem } from '../requests/search-parts';
import type { SearchRequest } from '../requests/search-request';
import { fetchRows, mostRows } from './export-rows';

export interface TableActionsProps {
  request: SearchRequest | undefined;
  rowCount: number;
  columns: readonly DataColumn<SearchItem>[];
}

/** Copies the rows as a spreadsheet takes them, or saves them as CSV; long ones show how far they are and can be left. */
export function TableActions({ request, rowCount, columns }: TableActionsProps) {
  const [said, setSaid] = useState('');
  const [running, setRunning] = useState(false);
  const abort = useRef<AbortController>(undefined);

  const run = async (
    most: number,
    deliver: (rows: SearchItem[]) => Promise<void> | void,
    done: string,
  ): Promise<void> => {
    if (request === undefined) return;
    abort.current = new AbortController();
    setRunning(true);
    try {
      const rows = await fetchRows(
        request,
        most,
        (count) => setSaid(`${count} rows read`),
        abort.current.signal,
      );
      await deliver(rows);
      const left = rowCount - rows.length;
      setSaid(`${rows.length} rows ${done}${left > 0 ? `, ${left} more left out` : ''}`);
    } catch (error) {
      setSaid(abort.current.signal.aborted ? 'Stopped' : problemOf(error).title);
    } finally {
      setRunning(false);
    }
  };

  return (
    <>
      <chakra.span role="status" fontSize="xs" color="fg.muted">
        {said}
      </chakra.span>
      {running ? (
        <Button variant="plain" onClick={() => abort.current?.abort()}>
          Stop
        </Button>
      ) : (
        <>
          <Button
            variant="plain"
            disabled={request === undefined || rowCount === 0}
            onClick={() =>
              void run(
                mostRows.clipboard,
                (rows) => navigator.clipboard.writeText(tabSeparated(columns, rows)),
                'copied',
              )
            }
          >
            Copy
          </Button>
          <Button
            variant="plain"
            disabled={request === undefined || rowCount === 0}
            onClick={() =>
              void run(
                mostRows.file,
                (rows) => saveText('parts.csv', 'text/csv', commaSeparated(columns, rows)),
                'saved',
              )
            }
          >
            Export
          </Button>
        </>
      )}
    </>
  );
}
