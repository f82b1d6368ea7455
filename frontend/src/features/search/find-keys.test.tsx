import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { endSession, startSession } from '../../api/session';
import { switchSingleKeys } from '../../components/single-key';
import { exampleAssessment, examplePart } from '../../test-support/assessed-part';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';

beforeEach(() => {
  switchSingleKeys(true);
  endSession();
  startSession(sessionOf(['designer'], [{ action: 'read', subject: ['Part', 'Family', 'Policy'] }]));
  serve(({ url }) => {
    if (url === '/policies') return { status: 200, data: { items: [] } };
    if (url !== '/parts/search') return { status: 404, data: {} };
    const items = [{ part: examplePart(), assessment: exampleAssessment(), overSpecification: [] }];
    return {
      status: 200,
      data: { total: 1, unrated: 0, byApproval: { preferred: 1 }, items, knockouts: [], relaxations: [] },
    };
  });
});

async function openFind(): Promise<HTMLElement> {
  renderApplication('/find?lower=4k5&upper=4k9');
  return screen.findByRole('grid');
}

describe('the keyboard in Find', () => {
  it('goes from an entry of the duty to the parts by Enter', async () => {
    await openFind();
    await userEvent.type(screen.getByRole('textbox', { name: 'Highest' }), '{Enter}');
    await screen.findByRole('grid');
    await new Promise(requestAnimationFrame);
    expect(screen.getByRole('grid')).toHaveFocus();
  });

  it('goes to the duty and to the parts by a single key', async () => {
    const grid = await openFind();
    screen.getByRole('main').focus();
    await userEvent.keyboard('p');
    await new Promise(requestAnimationFrame);
    expect(grid).toHaveFocus();
    await userEvent.keyboard('d');
    await new Promise(requestAnimationFrame);
    expect(screen.getByRole('textbox', { name: 'Lowest' })).toHaveFocus();
  });

  it('says which keys there are, and leaves single ones alone once they are switched off', async () => {
    const grid = await openFind();
    grid.focus();
    await userEvent.keyboard('?');
    const keys = await screen.findByRole('dialog', { name: 'Keys' });
    await userEvent.click(within(keys).getByRole('checkbox', { name: /Single keys/ }));
    await userEvent.click(within(keys).getByRole('button', { name: 'Close' }));
    grid.focus();
    await userEvent.keyboard('/d?');
    expect(grid).toHaveFocus();
    expect(screen.queryByRole('dialog', { name: 'Keys' })).not.toBeInTheDocument();
  });
});

describe('what Find tells a screen reader', () => {
  it('names the page by its count, and says the count aloud beside it', async () => {
    await openFind();
    expect(screen.getByRole('heading', { level: 1, name: '1 part meets it' })).toBeInTheDocument();
    const aloud = screen.getAllByRole('status').filter((status) => status.textContent === '1 part meets it');
    expect(aloud).toHaveLength(1);
    expect(aloud[0]?.closest('h1')).toBeNull();
  });
});
