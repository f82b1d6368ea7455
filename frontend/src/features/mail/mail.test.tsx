import { screen } from '@testing-library/react';
import { startSession } from '../../api/session';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';
import { letterPieces } from './letter-pieces';

const link = 'http://127.0.0.1:3000/accept-invitation#token=abc';

describe('mail', () => {
  it('shows a letter with its address to be followed', async () => {
    startSession(sessionOf(['administrator']));
    serve(() => ({
      status: 200,
      data: {
        id: '1',
        from: 'a',
        to: 'b',
        subject: 'Welcome',
        date: '',
        text: `Open ${link} soon`,
        links: [link],
      },
    }));
    renderApplication('/mail/1');
    expect(await screen.findByRole('heading', { name: 'Welcome' })).toBeVisible();
    expect(screen.getByRole('link', { name: link })).toHaveAttribute('href', link);
  });

  it('never makes a link of what is no web address', () => {
    expect(letterPieces('javascript:alert(1)', ['javascript:alert(1)'])).toEqual([
      { text: 'javascript:alert(1)', isLink: false },
    ]);
  });

  it('takes the longer of two addresses that begin alike', () => {
    const links = ['http://a.example.com', 'http://a.example.com/b'];
    expect(letterPieces('http://a.example.com/b', links)).toEqual([{ text: links[1], isLink: true }]);
  });
});
