import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { Problem } from '../api/problem';
import { renderInTheme } from '../test-support/render-in-theme';
import { Empty, Failed, Loading } from './states';

const clash = new Problem(
  'duty-clash',
  422,
  'The duty contradicts itself',
  'The lowest value lies above the highest.',
  'req-7',
  [{ pointer: '/duty/window/lower', message: 'lies above 4.9 kΩ' }],
  undefined,
);

describe('the designed states', () => {
  it('shows a refusal in words, with its fields where they say more, and nothing to try again', () => {
    renderInTheme(<Failed error={clash} onRetry={jest.fn()} />);
    const alert = screen.getByRole('alert');
    expect(alert).toHaveTextContent('The duty contradicts itself');
    expect(alert).toHaveTextContent('/duty/window/lower lies above 4.9 kΩ');
    expect(alert).not.toHaveTextContent('quote request');
    expect(screen.queryByRole('button', { name: 'Try again' })).not.toBeInTheDocument();
  });

  it('shows a failure of the server with the request to quote and a way to try again', async () => {
    const retry = jest.fn();
    const failure = new Problem('unexpected', 500, 'It went wrong', undefined, 'req-9', [], undefined);
    renderInTheme(<Failed error={failure} onRetry={retry} />);
    expect(screen.getByRole('alert')).toHaveTextContent('quote request req-9');
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(retry).toHaveBeenCalledTimes(1);
  });

  it('names the rule that forbids', () => {
    const rule = 'Only a component engineer may promote to preferred';
    renderInTheme(
      <Failed error={new Problem('forbidden', 403, 'Forbidden', undefined, 'req-8', [], rule)} />,
    );
    expect(screen.getByRole('alert')).toHaveTextContent(rule);
  });

  it('says what it waits for', () => {
    renderInTheme(<Loading label="Reading the part" />);
    expect(screen.getByRole('status')).toHaveTextContent('Reading the part');
    expect(screen.getByRole('status')).toHaveAttribute('aria-busy', 'true');
  });

  it('says what to do where nothing is', () => {
    renderInTheme(<Empty title="No part meets this duty">Loosen a demand.</Empty>);
    expect(screen.getByRole('heading', { name: 'No part meets this duty' })).toBeInTheDocument();
  });
});
