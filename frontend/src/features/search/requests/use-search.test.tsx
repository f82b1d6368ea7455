import { QueryClientProvider } from '@tanstack/react-query';
import { renderHook, waitFor } from '@testing-library/react';
import type { ReactNode } from 'react';
import { createQueryClient } from '../../../api/query-client';
import { serve } from '../../../test-support/serve';
import { readFind } from '../find-address';
import { questionOf } from '../question';
import { useSearch } from './use-search';

const asking = (address: string) => questionOf(readFind(new URLSearchParams(address)));

function searching(address: string) {
  const client = createQueryClient();
  const wrapper = ({ children }: { children: ReactNode }) => (
    <QueryClientProvider client={client}>{children}</QueryClientProvider>
  );
  return renderHook(useSearch, { wrapper, initialProps: asking(address) });
}

beforeEach(() => {
  serve(({ data }) => {
    const { duty } = JSON.parse(String(data)) as { duty: { window: { upper: number } } };
    return duty.window.upper < 4500
      ? { status: 422, data: { type: 'urn:resistry:problem:clash' } }
      : { status: 200, data: { total: duty.window.upper, items: [] } };
  });
});

describe('a search', () => {
  it('keeps the old answer with its question until the new one is there', async () => {
    const first = asking('lower=4k5&upper=4k9');
    const { result, rerender } = searching('lower=4k5&upper=4k9');
    rerender(first);
    await waitFor(() => expect(result.current.latest?.question).toBe(first));
    const second = asking('lower=4k5&upper=5k1');
    rerender(second);
    expect(result.current.waiting).toBe(true);
    expect(result.current.latest).toMatchObject({ question: first, answer: { total: 4900 } });
    await waitFor(() => expect(result.current.waiting).toBe(false));
    expect(result.current.latest).toMatchObject({ question: second, answer: { total: 5100 } });
  });

  it('takes an answer that is there already for the same question asked anew', async () => {
    const { result, rerender } = searching('lower=4k5&upper=4k9');
    await waitFor(() => expect(result.current.latest).toBeDefined());
    const again = asking('lower=4k5&upper=4k9');
    rerender(again);
    expect(result.current.latest?.question).toBe(again);
    expect(result.current.waiting).toBe(false);
  });

  it('tells a refusal and what was answered before it', async () => {
    const { result, rerender } = searching('lower=4k5&upper=4k9');
    await waitFor(() => expect(result.current.latest).toBeDefined());
    rerender(asking('lower=4k5&upper=4'));
    await waitFor(() => expect(result.current.error).toMatchObject({ status: 422 }));
    expect(result.current.waiting).toBe(false);
    expect(result.current.latest?.answer.total).toBe(4900);
  });

  it('asks nothing while an entry cannot be read', () => {
    const { result } = searching('lower=4k5&upper=much');
    expect(result.current).toMatchObject({ latest: undefined, waiting: false, error: null });
  });
});
