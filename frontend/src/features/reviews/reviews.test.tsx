import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { startSession } from '../../api/session';
import { examplePart } from '../../test-support/assessed-part';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';
import type { Review } from './requests/list-reviews';

const engineer = { id: 2, name: 'T. Harnwell' };

const open: Review = {
  id: 7,
  part: examplePart(),
  cause: 'lost-second-source',
  words: 'Its second source TEAL-1 is now withdrawn: <b>cracks</b>',
  state: 'open',
  openedBy: engineer,
  openedAt: '2026-11-24T10:00:00.000Z',
};

let asked: unknown[];
beforeEach(() => {
  asked = [];
  startSession(sessionOf(['component-engineer'], [{ action: 'read', subject: ['Part', 'Review'] }]));
  serve(({ params }) => {
    asked.push(params);
    const { state } = params as { state: string };
    if (state === 'open') return { status: 200, data: { total: 1, items: [open] } };
    const closed = {
      ...open,
      state: 'closed',
      closedBy: engineer,
      closedAt: '2026-12-01T10:00:00.000Z',
      outcome: 'preferred',
    };
    return { status: 200, data: { total: 1, items: [closed] } };
  });
});

describe('the reviews', () => {
  it('say why a part waits, in words and not in markup, and lead to it', async () => {
    renderApplication('/reviews');
    const row = await screen.findByRole('row', { name: /Lost its second source\. .*<b>cracks<\/b>/ });
    expect(row).toHaveTextContent('24 Nov 2026T. Harnwell');
    expect(within(row).getByRole('link')).toHaveAttribute('href', '/parts/122');
  });

  it('show what was decided, and keep in the address what is shown', async () => {
    const { addressNow } = renderApplication('/reviews');
    await userEvent.selectOptions(await screen.findByRole('combobox', { name: 'Show' }), 'closed');
    expect(await screen.findByRole('table', { name: 'Decided reviews' })).toHaveTextContent(
      'preferred, 1 Dec 2026',
    );
    expect(addressNow()).toBe('/reviews?state=closed&page=1');
    await waitFor(() => expect(asked.at(-1)).toMatchObject({ state: 'closed', page: 1 }));
  });
});
