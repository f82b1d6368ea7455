import { useSearchParams } from 'react-router-dom';
import { Button } from '../../components/button';
import { Page } from '../../components/page';
import { Empty, Failed, Loading } from '../../components/states';
import { auditQuery, readAuditFilter, writeAuditFilter } from './audit-address';
import { AuditFilters } from './audit-filters';
import { AuditTable } from './audit-table';
import { type AuditQuery, useAuditTrail } from './requests/list-audit';

function Trail({ query }: { query: AuditQuery }) {
  const trail = useAuditTrail(query);
  if (trail.isPending) return <Loading label="Reading the trail" lines={10} />;
  if (trail.data === undefined) return <Failed error={trail.error} onRetry={() => void trail.refetch()} />;
  const entries = trail.data.pages.flatMap((page) => page.items);
  if (entries.length === 0) return <Empty title="Nothing like that happened">Ask for less at once.</Empty>;
  return (
    <>
      <AuditTable entries={entries} />
      {trail.isFetchNextPageError && <Failed error={trail.error} />}
      {trail.hasNextPage && (
        <Button mt={4} disabled={trail.isFetchingNextPage} onClick={() => void trail.fetchNextPage()}>
          {trail.isFetchingNextPage ? 'Reading older ones' : 'Show older ones'}
        </Button>
      )}
    </>
  );
}

/** Who changed what, narrowed as the address says. */
export function Component() {
  const [address, setAddress] = useSearchParams();
  const filter = readAuditFilter(address);
  return (
    <Page title="Audit trail" lead="Every change, with who made it and why. Entries are never changed.">
      <AuditFilters filter={filter} onFilter={(changed) => setAddress(writeAuditFilter(changed))} />
      <Trail query={auditQuery(filter)} />
    </Page>
  );
}
