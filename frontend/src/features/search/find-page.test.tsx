import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { endSession, startSession } from '../../api/session';
import { exampleAssessment, examplePart } from '../../test-support/assessed-part';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';
import type { SearchRequest } from './requests/search-request';

const address = '/find?lower=4k5&upper=4k9&voltage=0..24&ambient=-20..70&life=10+years';

type Asked = SearchRequest & { page: number; pageSize: number };
let asked: Asked[] = [];

beforeEach(() => {
  asked = [];
  endSession();
  startSession(sessionOf(['designer'], [{ action: 'read', subject: ['Part', 'Family', 'Policy'] }]));
  serve((request) => {
    if (request.url === '/policies') {
      const policy = {
        id: 7,
        name: 'Brackwater',
        version: 3,
        origin: 'company',
        source: '',
        inForce: true,
        note: '',
      };
      return { status: 200, data: { items: [policy] } };
    }
    if (request.url === '/parts/search') {
      asked.push(JSON.parse(String(request.data)) as Asked);
      const items = [{ part: examplePart(), assessment: exampleAssessment(), overSpecification: [] }];
      const knockouts = [{ check: 'value', removes: 41_208, removesAlone: 96 }];
      const relaxations = [{ field: '/window/upper', to: 5000, gains: 44 }];
      return {
        status: 200,
        data: { total: 1, unrated: 6, byApproval: { preferred: 1 }, items, knockouts, relaxations },
      };
    }
    if (request.url === '/parts/122')
      return { status: 200, data: { ...examplePart(), modes: [], version: 1 } };
    if (request.url === '/parts/122/assessment') return { status: 200, data: exampleAssessment() };
    return { status: 404, data: {} };
  });
});

describe('Find', () => {
  it('sends what the address says, with the defaults openly, and shows the answer', async () => {
    renderApplication(address);
    expect(await screen.findByRole('heading', { name: '1 part meets it' })).toBeInTheDocument();
    expect(asked[0]?.duty).toMatchObject({
      window: { lower: 4500, upper: 4900 },
      load: { voltage: { min: 0, max: 24 } },
      approvals: ['approved', 'preferred'],
      supply: ['active'],
    });
    const row = screen.getAllByRole('row')[1];
    expect(row).toHaveTextContent('BW-R-00122');
    expect(row).toHaveTextContent('Preferred');
  });

  it('asks anew as one types, once the typing pauses, and keeps the address in step', async () => {
    const { addressNow } = renderApplication(address);
    await screen.findByRole('grid');
    const field = screen.getByRole('textbox', { name: 'Highest' });
    await userEvent.clear(field);
    await userEvent.type(field, '5k1');
    await waitFor(() => expect(asked.at(-1)?.duty.window?.upper).toBe(5100));
    await waitFor(() => expect(addressNow()).toContain('upper=5k1'));
  });

  it('asks nothing while an entry cannot be read, and keeps the rows', async () => {
    renderApplication(address);
    await screen.findByRole('grid');
    const field = screen.getByRole('textbox', { name: 'Highest' });
    await userEvent.clear(field);
    await userEvent.type(field, 'much');
    expect(screen.getByRole('alert')).toHaveTextContent('much');
    expect(screen.getByRole('grid')).toHaveTextContent('BW-R-00122');
    await userEvent.clear(field);
    await userEvent.type(field, '5k1');
    await waitFor(() => expect(asked.at(-1)?.duty.window?.upper).toBe(5100));
    // Nothing was asked on the way that lacked the end that could not be read.
    expect(asked.every((each) => [4900, 5100].includes(each.duty.window?.upper ?? NaN))).toBe(true);
  });

  it('takes a relaxation from the ledger', async () => {
    renderApplication(address);
    await userEvent.click(await screen.findByRole('button', { name: '5 kΩ highest brings 44' }));
    expect(screen.getByRole('textbox', { name: 'Highest' })).toHaveValue('5 kΩ');
    await waitFor(() => expect(asked.at(-1)?.duty.window?.upper).toBe(5000));
  });

  it('opens a row beside the list, and each line to its basis with its citation', async () => {
    const { addressNow } = renderApplication(address);
    const grid = await screen.findByRole('grid');
    grid.focus();
    await userEvent.keyboard('{Enter}');
    const sheet = await screen.findByRole('complementary', { name: 'Assessment' });
    await userEvent.click(await within(sheet).findByRole('button', { name: /^Dissipation/ }));
    expect(sheet).toHaveTextContent('P = U²/R');
    expect(sheet).toHaveTextContent('DS-ODF rev. C, page 3');
    expect(within(sheet).getByRole('button', { name: /^Insulation/ })).toHaveTextContent('unrated');
    expect(screen.getByRole('grid')).toBeInTheDocument();
    await waitFor(() => expect(addressNow()).toContain('part=122'));
  });

  it('shows the unrated when asked', async () => {
    renderApplication(address);
    await userEvent.click(await screen.findByRole('button', { name: '6 more are unrated: show them' }));
    await waitFor(() => expect(asked.at(-1)?.show).toBe('met-and-unrated'));
  });
});
