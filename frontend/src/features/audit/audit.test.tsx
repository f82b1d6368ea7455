import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { startSession } from '../../api/session';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';
import { auditQuery, readAuditFilter } from './audit-address';
import { changedFields } from './changed-fields';

const entry = (id: number) => ({
  id,
  recordedAt: '2026-11-24T10:00:00.000Z',
  actorId: 2,
  actorName: 'T. Harnwell',
  action: 'submit',
  subjectType: 'Part',
  subjectId: String(id),
  before: { approval: 'draft' },
  after: { approval: 'in-review', words: null },
  reason: 'Complete.',
});

const asked: Record<string, unknown>[] = [];

beforeEach(() => {
  asked.length = 0;
  startSession(sessionOf(['administrator']));
  serve(({ url, params }) => {
    if (url !== '/audit') return { status: 200, data: { items: [] } };
    const query = params as Record<string, unknown>;
    asked.push(query);
    if (query.before === 8) return { status: 200, data: { items: [entry(7)] } };
    return { status: 200, data: { items: [entry(9), entry(8)], next: 8 } };
  });
});

describe('the audit trail', () => {
  it('shows what changed, and older entries from where the page before ended', async () => {
    renderApplication('/audit');
    expect(
      await screen.findByRole('row', { name: /submit part 9 approval: draft → in-review Complete/ }),
    ).toBeVisible();
    await userEvent.click(screen.getByRole('button', { name: 'Show older ones' }));
    expect(await screen.findByRole('row', { name: /submit part 7/ })).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Show older ones' })).not.toBeInTheDocument();
  });

  it('narrows by what is entered, and keeps it in the address', async () => {
    const { addressNow } = renderApplication('/audit?subject=Part');
    await userEvent.selectOptions(await screen.findByRole('combobox', { name: 'Action' }), 'submit');
    await userEvent.click(screen.getByRole('button', { name: 'Show' }));
    await waitFor(() => expect(addressNow()).toBe('/audit?subject=Part&action=submit'));
    await waitFor(() => expect(asked.at(-1)).toMatchObject({ subjectType: 'Part', action: 'submit' }));
  });

  it('counts the last day whole', () => {
    const { from, to } = auditQuery(readAuditFilter(new URLSearchParams('from=2026-11-24&to=2026-11-24')));
    // One day of 24 h lies between: no change of clocks falls on it in any time zone.
    expect(Date.parse(to ?? '') - Date.parse(from ?? '')).toBe(86_400_000);
  });

  it('leaves out what did not change, and nothing that became nothing', () => {
    expect(changedFields({ before: { a: 1, b: 'x' }, after: { a: 1, b: null, c: null } })).toEqual([
      { field: 'b', before: 'x', after: undefined },
    ]);
  });
});
