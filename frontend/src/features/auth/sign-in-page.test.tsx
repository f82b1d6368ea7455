import { act, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { endSession, expireSession, startSession } from '../../api/session';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';

beforeEach(() => {
  endSession();
  serve((request) => {
    if (request.url !== '/auth/sign-in') return { status: 404, data: {} };
    const { password } = JSON.parse(String(request.data)) as { password: string };
    if (password === 'right') return { status: 200, data: sessionOf() };
    return { status: 401, data: { title: 'Sign in first', detail: 'They do not go together.' } };
  });
});

async function enter(password: string): Promise<void> {
  await userEvent.clear(screen.getByLabelText('Password'));
  await userEvent.type(screen.getByLabelText('Password'), password);
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
}

describe('signing in', () => {
  it('keeps what was entered when it is refused, then leads to the page that was asked for', async () => {
    const { addressNow } = renderApplication('/nowhere?lower=4k5');
    await userEvent.type(
      await screen.findByRole('textbox', { name: 'E-mail' }),
      'designer@brackwater.example.com',
    );
    await enter('wrong');
    expect(await screen.findByRole('alert')).toHaveTextContent('Not signed inThey do not go together.');
    expect(screen.getByRole('textbox', { name: 'E-mail' })).toHaveValue('designer@brackwater.example.com');
    await enter('right');
    await waitFor(() => expect(addressNow()).toBe('/nowhere?lower=4k5'));
  });

  it('says at the field what is wrong with an entry', async () => {
    renderApplication('/sign-in');
    await userEvent.type(await screen.findByRole('textbox', { name: 'E-mail' }), 'nobody');
    await enter('right');
    expect(await screen.findByText('This is not an e-mail address.')).toBeInTheDocument();
  });

  it('asks again over the page when the sign-in lapses, and the page stays', async () => {
    startSession(sessionOf());
    renderApplication('/nowhere');
    const heading = await screen.findByRole('heading', { name: 'Nothing is here' });
    act(expireSession);
    const dialog = await screen.findByRole('dialog', { name: 'Sign in again' });
    expect(heading).toBeInTheDocument();
    await enter('right');
    await waitFor(() => expect(dialog).not.toBeInTheDocument());
  });
});
