import { screen } from '@testing-library/react';
import { startSession } from '../../api/session';
import { renderApplication } from '../../test-support/render-application';
import { type Answer, serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';

const rule = (role: string, conditional: boolean, sentence: string) => ({
  role,
  action: 'approve',
  subject: 'Part',
  conditional,
  sentence,
});

const table: Answer = {
  status: 200,
  data: {
    roles: ['librarian', 'component-engineer'],
    actions: ['approve'],
    subjects: ['Part'],
    rows: [rule('component-engineer', true, 'None that he or she entered.')],
  },
};

const open = (answer: Answer): void => {
  startSession(sessionOf(['administrator']));
  serve(() => answer);
  renderApplication('/permissions');
};

describe('who may do what', () => {
  it('says it of each role, with the sentence of the rule', async () => {
    open(table);
    const line = await screen.findByRole('row', {
      name: 'approve part no may, if None that he or she entered.',
    });
    expect(line).toBeVisible();
  });

  it('names the rule where it is forbidden', async () => {
    open({ status: 403, data: { title: 'This is not yours to do', rule: 'read Permission' } });
    expect(await screen.findByRole('heading', { name: 'This is kept for other roles' })).toBeVisible();
    expect(screen.getByText('The rule: read Permission')).toBeVisible();
  });
});
