import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { startSession } from '../../api/session';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';

const session = (id: string, current: boolean) => ({
  id,
  userAgent: current
    ? 'Mozilla/5.0 (X11; Linux x86_64) Firefox/140.0'
    : 'Mozilla/5.0 (Windows NT 10.0) Edg/140.0',
  address: '192.0.2.7',
  createdAt: '2026-11-01T08:00:00.000Z',
  lastUsedAt: '2026-12-01T08:00:00.000Z',
  current,
});

let sessions = [session('here', true), session('there', false)];

beforeEach(() => {
  sessions = [session('here', true), session('there', false)];
  startSession(sessionOf());
  serve(({ method, url, data }) => {
    if (method === 'delete') sessions = sessions.filter(({ id }) => url !== `/account/sessions/${id}`);
    if (url === '/account/sessions') return { status: 200, data: { items: sessions } };
    if (url === '/account/password' && String(data).includes('"currentPassword":"wrong"'))
      return { status: 400, data: { title: 'This is not your password', errors: [] } };
    return { status: 204, data: undefined };
  });
});

describe('the own account', () => {
  it('changes the name, which the bar shows at once', async () => {
    renderApplication('/account');
    const name = await screen.findByRole('textbox', { name: 'Name' });
    await userEvent.clear(name);
    await userEvent.click(screen.getByRole('button', { name: 'Change the name' }));
    expect(await screen.findByText('Enter your name as colleagues know it.')).toBeInTheDocument();
    await userEvent.type(name, 'Ida Tamsin');
    await userEvent.click(screen.getByRole('button', { name: 'Change the name' }));
    expect(await screen.findByText('The name is changed.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: /Ida Tamsin/ })).toBeInTheDocument();
  });

  it('keeps what was entered when the password is refused', async () => {
    renderApplication('/account');
    await userEvent.type(await screen.findByLabelText('Password now'), 'wrong');
    await userEvent.type(screen.getByLabelText('New password'), 'four plain words');
    await userEvent.type(screen.getByLabelText('Once more'), 'four plain words');
    await userEvent.click(screen.getByRole('button', { name: 'Change the password' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('This is not your password');
    expect(screen.getByLabelText('New password')).toHaveValue('four plain words');
  });

  it('ends another sign-in, and never offers to end this one in the list', async () => {
    renderApplication('/account');
    const table = await screen.findByRole('table', { name: 'Where you are signed in' });
    expect(within(table).getByRole('row', { name: /Firefox on Linux/ })).toHaveTextContent('this one');
    await userEvent.click(within(table).getByRole('button', { name: /End Edge on Windows/ }));
    await waitFor(() => expect(within(table).queryByText('Edge on Windows')).not.toBeInTheDocument());
  });
});
