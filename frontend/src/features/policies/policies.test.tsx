import { screen } from '@testing-library/react';
import { startSession } from '../../api/session';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';

describe('a policy', () => {
  it('shows whom each entry is for and how much it leaves', async () => {
    startSession(sessionOf());
    const entry = {
      match: { technology: 'wirewound' },
      powerRatio: 0.5,
      reading: 'multiplied',
      voltageRatio: 0.8,
    };
    serve(() => ({
      status: 200,
      data: {
        id: 1,
        name: 'Brackwater',
        version: 1,
        origin: 'company',
        source: 's',
        note: 'n',
        entries: [entry],
      },
    }));
    renderApplication('/policies/1');
    expect(
      await screen.findByRole('row', {
        name: /Wirewound 50 % .*80 % not stated not stated not stated not stated$/,
      }),
    ).toBeVisible();
  });
});
