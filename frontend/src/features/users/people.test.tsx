import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { startSession } from '../../api/session';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';

const person = (id: number, name: string) => ({
  id,
  name,
  email: `${id}@brackwater.example.com`,
  roles: ['designer'],
  state: 'active',
  version: 4,
  createdAt: '2026-01-01T08:00:00.000Z',
});

const sent: { url?: string; data: unknown }[] = [];
let refuse = false;

beforeEach(() => {
  sent.length = 0;
  refuse = false;
  startSession(sessionOf(['administrator']));
  serve(({ method, url, data }) => {
    if (method !== 'get') {
      sent.push({ url, data: JSON.parse(String(data)) });
      return refuse ? { status: 409, data: { title: 'Somebody was quicker' } } : { status: 200, data: {} };
    }
    if (url === '/users')
      return { status: 200, data: { items: [person(1, 'I. Tamsin'), person(2, 'O. Lind')] } };
    return { status: 200, data: { items: [] } };
  });
});

describe('people', () => {
  it('are kept out with a reason that stays when it is refused, and never oneself', async () => {
    refuse = true;
    renderApplication('/people');
    await userEvent.click(await screen.findByRole('button', { name: 'Keep O. Lind out' }));
    expect(screen.queryByRole('button', { name: 'Keep I. Tamsin out' })).not.toBeInTheDocument();
    const dialog = await screen.findByRole('dialog', { name: 'Keep O. Lind out' });
    await userEvent.type(within(dialog).getByRole('textbox', { name: 'Reason' }), 'Left the company.');
    await userEvent.click(within(dialog).getByRole('button', { name: 'Keep out' }));
    expect(await within(dialog).findByRole('alert')).toHaveTextContent('Somebody was quicker');
    expect(within(dialog).getByRole('textbox', { name: 'Reason' })).toHaveValue('Left the company.');
    expect(sent).toEqual([{ url: '/users/2/deactivate', data: { reason: 'Left the company.', version: 4 } }]);
  });

  it('get the roles that are ticked, with the version that was seen', async () => {
    renderApplication('/people');
    await userEvent.click(await screen.findByRole('button', { name: 'Change the roles of O. Lind' }));
    const dialog = await screen.findByRole('dialog', { name: 'Roles of O. Lind' });
    await userEvent.click(within(dialog).getByRole('checkbox', { name: 'librarian' }));
    await userEvent.click(within(dialog).getByRole('button', { name: 'Give these roles' }));
    expect(await within(dialog).findByText(/Say why/)).toBeVisible();
    await userEvent.type(within(dialog).getByRole('textbox', { name: 'Reason' }), 'Enters families now.');
    await userEvent.click(within(dialog).getByRole('button', { name: 'Give these roles' }));
    await waitFor(() => expect(dialog).not.toBeInTheDocument());
    expect(sent).toEqual([
      {
        url: '/users/2/roles',
        data: { roles: ['librarian', 'designer'], reason: 'Enters families now.', version: 4 },
      },
    ]);
  });

  it('are invited by address and roles', async () => {
    renderApplication('/people');
    await userEvent.type(
      await screen.findByRole('textbox', { name: 'E-mail' }),
      'new@brackwater.example.com',
    );
    await userEvent.click(screen.getByRole('button', { name: 'Invite' }));
    expect(await screen.findByText(/on its way to new@brackwater/)).toBeVisible();
    expect(sent[0]).toEqual({
      url: '/invitations',
      data: { email: 'new@brackwater.example.com', roles: ['designer'] },
    });
  });
});
