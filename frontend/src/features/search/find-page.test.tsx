import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { endSession, startSession } from '../../api/session';
import { exampleAssessment, examplePart } from '../../test-support/assessed-part';
import { renderApplication } from '../../test-support/render-application';
import { type Answer, serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';
import type { Facets } from './requests/get-facets';
import type { SearchRequest } from './requests/search-request';

const address = '/find?lower=4k5&upper=4k9&voltage=0..24&ambient=-20..70&life=10+years';

type Asked = SearchRequest & { page: number; pageSize: number };
let asked: Asked[] = [];
let answerInstead: Answer | undefined;

const facets: Facets = {
  manufacturers: [{ id: 1, code: 'ODM', name: 'Oddmoor', parts: 10 }],
  families: [{ id: 1, code: 'ODF', name: 'General purpose', manufacturerId: 1, parts: 10 }],
  technologies: [{ value: 'thick-film', parts: 10 }],
  sizes: [{ code: '1206', metricCodes: ['3216M'], parts: 10 }],
  series: [{ value: 'E24', parts: 10 }],
  tolerances: [{ value: 0.01, parts: 10 }],
  tcrs: [{ value: 1e-4, parts: 10 }],
  mountings: [{ value: 'surface', parts: 10 }],
};

beforeEach(() => {
  asked = [];
  answerInstead = undefined;
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
    if (request.url === '/facets') return { status: 200, data: facets };
    if (request.url === '/parts/search') {
      const question = JSON.parse(String(request.data)) as Asked;
      asked.push(question);
      if (answerInstead !== undefined) return answerInstead;
      const item = { part: examplePart(), assessment: exampleAssessment(), overSpecification: [] };
      const second = {
        ...item,
        part: examplePart({ id: 123, manufacturer: { id: 2, code: 'LKS', name: 'Larkstone' } }),
      };
      const group = { companyPartNumber: { id: 7, number: 'BW-R-00122' }, sources: [item, second] };
      const items = [question.group === 'company' ? { ...item, ...group } : item];
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
    expect(asked.every((each) => each.duty.window?.upper !== undefined)).toBe(true);
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

  it('narrows the list to a size, names it above the table, and takes it away again', async () => {
    const { addressNow } = renderApplication(address);
    await screen.findByRole('grid');
    await userEvent.click(
      within(screen.getByRole('region', { name: 'Only these parts' })).getAllByText('Size')[0] ??
        document.body,
    );
    await userEvent.click(screen.getByRole('checkbox', { name: /^1206\/3216M/ }));
    await waitFor(() => expect(asked.at(-1)?.filters?.sizes).toEqual(['1206']));
    await waitFor(() => expect(addressNow()).toContain('size=1206'));
    await userEvent.click(screen.getByRole('button', { name: 'Take away: Size: 1206/3216M' }));
    await waitFor(() => expect(addressNow()).not.toContain('size='));
    expect(screen.getByRole('checkbox', { name: /^1206\/3216M/ })).not.toBeChecked();
  });

  it('reads every filter from a link', async () => {
    renderApplication(
      `${address}&tolerance=1%25&tcr=100ppm/K&series=E24&numbered=yes&offered=yes&certificate=yes`,
    );
    await screen.findByRole('grid');
    expect(asked[0]?.filters).toMatchObject({
      series: ['E24'],
      certificate: true,
      companyPartNumber: true,
      offer: true,
    });
    expect(asked[0]?.filters?.tolerances?.[0]).toBeCloseTo(0.01, 12);
    expect(asked[0]?.filters?.tcrs?.[0]).toBeCloseTo(1e-4, 12);
    expect(screen.getByRole('button', { name: 'Take away: Tolerance: ±1 %' })).toBeInTheDocument();
  });

  it('unfolds a company number to its judged sources', async () => {
    renderApplication(`${address}&group=company`);
    const unfold = await screen.findByRole('button', { name: '2 sources' });
    expect(screen.getAllByRole('row')).toHaveLength(2);
    await userEvent.click(unfold);
    expect(screen.getByRole('button', { name: '2 sources', expanded: true })).toBeInTheDocument();
    expect(screen.getAllByRole('row')).toHaveLength(4);
    expect(screen.getAllByRole('row')[3]).toHaveTextContent('Larkstone');
    screen.getByRole('grid').focus();
    await userEvent.keyboard(' ');
    expect(screen.getAllByRole('row')).toHaveLength(2);
  });

  it('puts a clash at the entry it is about, and says that nothing was searched', async () => {
    const message = 'The smallest voltage is above the largest.';
    answerInstead = {
      status: 422,
      data: {
        type: 'urn:resistry:problem:clash',
        title: 'The request contradicts itself or the data',
        errors: ['min', 'max'].map((end) => ({ pointer: `/duty/load/voltage/${end}`, message })),
      },
    };
    renderApplication(address);
    expect(await screen.findByRole('heading', { name: 'The duty contradicts itself' })).toBeInTheDocument();
    expect(screen.getByRole('textbox', { name: 'Voltage' })).toHaveAccessibleDescription(message);
  });

  it('says what stands in the way where nothing meets the duty, and loosens it', async () => {
    const knockouts = [{ check: 'value', removes: 41_208, removesAlone: 96 }];
    const relaxations = [{ field: '/window/upper', to: 5000, gains: 44 }];
    answerInstead = {
      status: 200,
      data: { total: 0, unrated: 2, byApproval: {}, items: [], knockouts, relaxations },
    };
    renderApplication(address);
    const title = await screen.findByRole('heading', { name: 'No part meets all of this' });
    expect(title.parentElement).toHaveTextContent('96 parts fail it and nothing else');
    await userEvent.click(
      within(title.parentElement ?? document.body).getByRole('button', { name: '5 kΩ highest brings 44' }),
    );
    await waitFor(() => expect(asked.at(-1)?.duty.window?.upper).toBe(5000));
  });

  it('gives the quick search the keyboard at a slash, but not while one types', async () => {
    renderApplication(address);
    await screen.findByRole('grid');
    await userEvent.type(screen.getByRole('textbox', { name: 'Highest' }), '/');
    expect(screen.getByRole('textbox', { name: 'Highest' })).toHaveFocus();
    screen.getByRole('grid').focus();
    await userEvent.keyboard('/');
    expect(screen.getAllByRole('searchbox', { hidden: true })).toContain(document.activeElement);
  });
});
