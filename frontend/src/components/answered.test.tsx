import { useQuery } from '@tanstack/react-query';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { renderInTheme } from '../test-support/render-in-theme';
import { Answered } from './answered';

let answer: () => Promise<string>;

function Asking() {
  const query = useQuery({ queryKey: ['word'], queryFn: () => answer(), retry: false });
  return (
    <Answered query={query} label="Reading the word">
      {(word) => (
        <>
          <p>{word}</p>
          <input aria-label="Reason" />
          <button type="button" onClick={() => void query.refetch()}>
            Ask again
          </button>
        </>
      )}
    </Answered>
  );
}

const show = (): void => {
  renderInTheme(
    <QueryClientProvider client={new QueryClient()}>
      <Asking />
    </QueryClientProvider>,
  );
};

describe('what was answered', () => {
  it('stays, with what is being typed, when it cannot be read again', async () => {
    answer = () => Promise.resolve('first');
    show();
    await userEvent.type(await screen.findByLabelText('Reason'), 'cracks');
    answer = () => Promise.reject(new Error('no answer'));
    await userEvent.click(screen.getByRole('button', { name: 'Ask again' }));
    expect(await screen.findByText(/could not be read again/)).toBeVisible();
    expect(screen.getByText('first')).toBeVisible();
    expect(screen.getByLabelText('Reason')).toHaveValue('cracks');
    answer = () => Promise.resolve('second');
    await userEvent.click(screen.getByRole('button', { name: 'Read it again' }));
    expect(await screen.findByText('second')).toBeVisible();
    expect(screen.queryByText(/could not be read again/)).not.toBeInTheDocument();
    expect(screen.getByLabelText('Reason')).toHaveValue('cracks');
  });

  it('is a failure where nothing was ever read', async () => {
    answer = () => Promise.reject(new Error('no answer'));
    show();
    expect(await screen.findByRole('alert')).toHaveTextContent('no answer');
    expect(screen.queryByLabelText('Reason')).not.toBeInTheDocument();
  });
});
