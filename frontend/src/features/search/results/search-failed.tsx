import { Problem } from '../../../api/problem';
import { Empty, Failed } from '../../../components/states';

/** A search without an answer. A duty that contradicts itself is said as such; its entries carry the same words. */
export function SearchFailed({ error, onRetry }: { error: Error; onRetry: () => void }) {
  if (!(error instanceof Problem) || error.status !== 422) return <Failed error={error} onRetry={onRetry} />;
  const messages = [...new Set(error.fields.map((field) => field.message))];
  return (
    <div role="alert">
      <Empty title="The duty contradicts itself">
        {messages.length > 0 ? messages.join(' ') : error.detail} Nothing was searched; the entries it speaks
        of are marked.
      </Empty>
    </div>
  );
}
