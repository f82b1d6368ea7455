import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { startSession } from '../../api/session';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';

const name = '2026-12-01T00-00-00';

describe('backups', () => {
  it('show the command that puts one back, and what a check found', async () => {
    startSession(sessionOf(['administrator']));
    serve(({ method }) =>
      method === 'post'
        ? { status: 200, data: { sound: false, faults: ['The database differs from its checksum.'] } }
        : { status: 200, data: { items: [{ name }] } },
    );
    renderApplication('/backups');
    const row = within(await screen.findByRole('row', { name: new RegExp(name) }));
    expect(row.getByText(`npm run restore -w backend -- ${name}`)).toBeVisible();
    expect(row.getByText(/damaged/)).toBeVisible();
    await userEvent.click(row.getByRole('button', { name: `Check ${name}` }));
    expect(await row.findByRole('alert')).toHaveTextContent('The database differs from its checksum.');
  });
});
