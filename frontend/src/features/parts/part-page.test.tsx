import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { endSession, startSession } from '../../api/session';
import { exampleAssessment, examplePart } from '../../test-support/assessed-part';
import { examplePartDetails } from '../../test-support/part-details';
import { renderApplication } from '../../test-support/render-application';
import { type Answer, serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';
import type { AssessmentRequest } from './requests/assess-part';
import type { PartDetails } from './requests/get-part';
import type { Transitions } from './requests/get-transitions';

const address = '/parts/122?lower=4k5&upper=4k9&voltage=0..24';

let part: PartDetails;
let transitions: Transitions;
let assessed: AssessmentRequest[];
let sent: unknown[];
let answerToChange: () => Answer;

beforeEach(() => {
  part = examplePartDetails();
  assessed = [];
  sent = [];
  transitions = {
    version: 4,
    approval: 'preferred',
    supply: 'active',
    approvalTransitions: [
      {
        to: 'restricted',
        action: 'restrict',
        allowed: true,
        demands: [{ name: 'words', field: 'words', met: false, words: 'A restriction says what for.' }],
      },
    ],
    supplyTransitions: [
      {
        to: 'last-time-buy',
        action: 'set-supply-status',
        allowed: false,
        forbiddenBy: { rule: 'set-supply-status Part', words: 'Purchasing sets the supply status.' },
        demands: [
          {
            name: 'last-order-date',
            field: 'lastOrderDate',
            met: false,
            words: 'It needs its last order date.',
          },
        ],
      },
    ],
  };
  answerToChange = () => ({ status: 200, data: part });
  endSession();
  startSession(sessionOf(['component-engineer'], [{ action: 'read', subject: ['Part', 'Policy'] }]));
  serve((request) => {
    switch (request.url) {
      case '/policies':
        return { status: 200, data: { items: [] } };
      case '/parts/122':
        return { status: 200, data: part };
      case '/parts/122/transitions':
        return { status: 200, data: transitions };
      case '/parts/122/alternates': {
        const alternate = {
          part: examplePart({ id: 200, companyPartNumber: undefined, manufacturerPartNumber: 'LKP1206-4K7' }),
          sameCompanyPartNumber: false,
          otherManufacturer: true,
          sound: true,
          judgement: 'lesser',
          shortfalls: [
            {
              field: 'ratedDissipation',
              mode: 'power',
              sense: 'worse',
              own: '400 mW',
              alternate: '250 mW',
            },
            { field: 'limitingElementVoltage', sense: 'unknown', own: '200 V' },
          ],
          differences: [{ field: 'tcr', sense: 'worse', own: '100 ppm/K', alternate: '200 ppm/K' }],
        };
        return { status: 200, data: { total: 1, items: [alternate] } };
      }
      case '/parts/122/assessment':
        assessed.push(JSON.parse(String(request.data)) as AssessmentRequest);
        return { status: 200, data: exampleAssessment() };
      case '/parts/122/approval':
        sent.push(JSON.parse(String(request.data)));
        return answerToChange();
      default:
        return { status: 404, data: {} };
    }
  });
});

const table = (name: string) => screen.findByRole('table', { name });

describe('the page of a part', () => {
  it('holds the part against the duty that came along, and against a changed one', async () => {
    renderApplication(address);
    expect(await screen.findByRole('heading', { level: 1, name: 'BW-R-00122' })).toBeInTheDocument();
    expect(await screen.findByRole('button', { name: /^Dissipation/ })).toBeInTheDocument();
    expect(assessed[0]?.duty).toMatchObject({ window: { lower: 4500, upper: 4900 } });
    await userEvent.click(screen.getByRole('button', { name: 'Highest: 4.9 kΩ. Change it' }));
    const field = screen.getAllByRole('textbox', { name: 'Highest' })[0] ?? document.body;
    await userEvent.clear(field);
    await userEvent.type(field, '5k1{Enter}');
    await waitFor(() => expect(assessed.at(-1)?.duty.window?.upper).toBe(5100));
  });

  it('says of each rating where it stands, mode by mode, and what is not stated', async () => {
    renderApplication(address);
    const ratings = await table('Ratings');
    const row = within(ratings).getByRole('row', { name: /^Rated dissipation/ });
    expect(row).toHaveTextContent('250 mW');
    expect(row).toHaveTextContent('400 mW');
    expect(row).toHaveTextContent('DS-ODF, revision C, page 3');
    expect(within(ratings).getByRole('row', { name: /^Insulation voltage/ })).toHaveTextContent('not stated');
  });

  it('opens a permitted value to its basis', async () => {
    renderApplication(address);
    await userEvent.click(await screen.findByText('167.5'));
    expect(screen.getAllByText('P = U²/R')[0]).toBeInTheDocument();
  });

  it('judges an alternate, names what it lacks and how it differs, and offers with their prices', async () => {
    renderApplication(address);
    const alternates = await screen.findByRole('list', { name: 'Alternates' });
    expect(alternates).toHaveTextContent('Not equalrated dissipation 400 mW → 250 mW in the mode “power”');
    expect(alternates).toHaveTextContent('Cannot be said for limiting element voltage 200 V → not stated');
    expect(alternates).toHaveTextContent('Differences: 1 worse');
    expect(alternates).toHaveTextContent('Worse: TCR 100 ppm/K → 200 ppm/K');
    expect(within(alternates).getByRole('link', { name: 'LKP1206-4K7' })).toHaveAttribute(
      'href',
      expect.stringContaining('/parts/200?'),
    );
    expect(await table('Offers, € a piece')).toHaveTextContent('0.0060');
  });

  it('says whose a change is that the person may not make', async () => {
    renderApplication(address);
    await userEvent.click(await screen.findByText('What each change demands, and whose it is'));
    expect(screen.getByText(/Purchasing sets the supply status/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Announce a last-time buy' })).not.toBeInTheDocument();
  });

  it('restricts only with words, scope and reason, and then shows the new history', async () => {
    renderApplication(address);
    await userEvent.click(await screen.findByRole('button', { name: 'Restrict' }));
    const dialog = await screen.findByRole('dialog', { name: 'Restrict' });
    await userEvent.click(within(dialog).getByRole('button', { name: 'Restrict' }));
    expect(await within(dialog).findByText('Name the scope.')).toBeInTheDocument();
    expect(sent).toEqual([]);
    await userEvent.type(within(dialog).getByLabelText(/What it may not be used for/), 'Indoors only.');
    await userEvent.type(within(dialog).getByLabelText(/^Scope/), 'buoys');
    await userEvent.type(within(dialog).getByLabelText('Reason'), 'Salt mist.');
    const step = {
      from: 'preferred' as const,
      to: 'restricted' as const,
      words: 'Indoors only.',
      scope: 'buoys',
      reason: 'Salt mist.',
      changedBy: { id: 1, name: 'I. Tamsin' },
      changedAt: '2026-12-01T10:00:00.000Z',
    };
    part = { ...part, approval: 'restricted', version: 5, approvalHistory: [step, ...part.approvalHistory] };
    await userEvent.click(within(dialog).getByRole('button', { name: 'Restrict' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    expect(sent).toEqual([
      { to: 'restricted', reason: 'Salt mist.', version: 4, words: 'Indoors only.', scope: 'buoys' },
    ]);
    const history = screen.getByRole('region', { name: 'Approval history' });
    expect(history).toHaveTextContent('Indoors only. Scope: buoys.');
  });

  it('says that somebody else was quicker, reads the part again and keeps what was written', async () => {
    renderApplication(address);
    await userEvent.click(await screen.findByRole('button', { name: 'Restrict' }));
    const dialog = await screen.findByRole('dialog', { name: 'Restrict' });
    await userEvent.type(within(dialog).getByLabelText(/What it may not be used for/), 'Indoors only.');
    await userEvent.type(within(dialog).getByLabelText(/^Scope/), 'buoys');
    await userEvent.type(within(dialog).getByLabelText('Reason'), 'Salt mist.');
    part = { ...part, approval: 'approved', version: 5 };
    transitions = { ...transitions, approval: 'approved', version: 5 };
    answerToChange = () => ({
      status: 409,
      data: { type: 'urn:resistry:problem:stale', title: 'Somebody else has changed this meanwhile' },
    });
    await userEvent.click(within(dialog).getByRole('button', { name: 'Restrict' }));
    expect(await within(dialog).findByText(/it is approved now. What you wrote/)).toBeInTheDocument();
    expect(within(dialog).getByLabelText('Reason')).toHaveValue('Salt mist.');
    answerToChange = () => ({ status: 200, data: part });
    await userEvent.click(within(dialog).getByRole('button', { name: 'Restrict' }));
    await waitFor(() => expect(sent.at(-1)).toMatchObject({ version: 5 }));
  });

  it('shows a demand that the server finds unmet at the entry it is about', async () => {
    answerToChange = () => ({
      status: 422,
      data: { title: 'It clashes', errors: [{ pointer: '/scope', message: 'No such site.' }] },
    });
    renderApplication(address);
    await userEvent.click(await screen.findByRole('button', { name: 'Restrict' }));
    const dialog = await screen.findByRole('dialog', { name: 'Restrict' });
    await userEvent.type(within(dialog).getByLabelText(/What it may not be used for/), 'Indoors only.');
    await userEvent.type(within(dialog).getByLabelText(/^Scope/), 'moon');
    await userEvent.type(within(dialog).getByLabelText('Reason'), 'Salt mist.');
    await userEvent.click(within(dialog).getByRole('button', { name: 'Restrict' }));
    await waitFor(() =>
      expect(within(dialog).getByLabelText(/^Scope/)).toHaveAccessibleDescription('No such site.'),
    );
  });
});
