import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { startSession } from '../../api/session';
import { renderApplication } from '../../test-support/render-application';
import { serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';

const size = { id: 12, code: '1206', metricCode: '3216M' };
const datasheet = { id: 4, documentNumber: 'DS-ODF', revision: 'C' };
const person = { id: 1, name: 'I. Tamsin' };

const summary = {
  id: 7,
  code: 'ODF',
  name: 'Thick film chip',
  manufacturer: { id: 1, code: 'ODM', name: 'Oddmoor' },
  technology: 'thick-film',
  revision: { number: 2, publishedAt: '2026-03-01T09:00:00.000Z' },
  sizes: 1,
  parts: 1286,
  approvals: { draft: 0, 'in-review': 0, approved: 1221, preferred: 65, restricted: 0, withdrawn: 0 },
};

const revision = {
  number: 2,
  state: 'published',
  current: true,
  description: 'Issue C',
  enteredBy: person,
  enteredAt: '2026-02-01T09:00:00.000Z',
  features: [],
  orderingCodeTemplate: '{family}{size}-{resistance:rkm}',
  orderingCodeExamples: [],
  sizes: [
    {
      size,
      bodyStyle: 'chip',
      parts: 1286,
      modes: [
        {
          name: 'standard',
          ratings: {
            technology: 'thick-film',
            ratedDissipation: 0.25,
            derating: {
              axis: 'ambient',
              points: [
                [70, 1],
                [155, 0],
              ],
            },
          },
        },
      ],
    },
  ],
  ranges: [{ size, tolerance: 0.01, min: 1, max: 1e6, series: ['E96'] }],
  packagings: [],
  citations: [{ field: 'ratedDissipation', datasheet, page: 3 }],
};

const details = {
  ...summary,
  enteredBy: person,
  enteredAt: '2026-02-01T09:00:00.000Z',
  revision,
  revisions: [revision],
  declarations: [],
  certificates: [
    {
      kind: 'safety',
      standard: 'IEC 60065',
      number: 'S-1',
      issuedOn: '2020-01-01',
      expiresOn: '2025-01-01',
      expired: true,
    },
  ],
  datasheets: [],
};

const asked: unknown[] = [];

beforeEach(() => {
  asked.length = 0;
  startSession(sessionOf());
  serve(({ url, params }) => {
    if (url === '/families/7/revisions/1')
      return { status: 200, data: { ...revision, number: 1, current: false } };
    if (url === '/families/7') return { status: 200, data: details };
    if (url === '/families') {
      asked.push(params);
      const { q } = params as { q?: string };
      return { status: 200, data: { items: q === 'nothing' ? [] : [summary] } };
    }
    return { status: 200, data: { items: [] } };
  });
});

describe('families', () => {
  it('are narrowed by what is typed, and an empty answer offers the way back', async () => {
    const { addressNow } = renderApplication('/families?technology=thick-film');
    expect(
      await screen.findByRole('row', { name: /ODF.*Oddmoor.*65 preferred, 1,221 approved/ }),
    ).toBeVisible();
    await userEvent.type(screen.getByRole('searchbox', { name: 'Code, name or manufacturer' }), 'nothing');
    expect(await screen.findByRole('heading', { name: 'No family is like that' })).toBeVisible();
    expect(asked.at(-1)).toMatchObject({ q: 'nothing', technology: 'thick-film' });
    await userEvent.click(screen.getByRole('button', { name: 'Show all families' }));
    await waitFor(() => expect(addressNow()).toBe('/families'));
  });

  it('show what the datasheet states, where, and what it does not', async () => {
    renderApplication('/families/7');
    const ratings = await screen.findByRole('table', { name: 'Ratings by size' });
    const dissipation = within(ratings).getByRole('row', { name: /Rated dissipation/ });
    expect(within(dissipation).getByRole('cell')).toHaveTextContent('250 mW');
    expect(dissipation).toHaveTextContent('DS-ODF rev. C, page 3');
    expect(within(ratings).getByRole('row', { name: /Insulation voltage/ })).toHaveTextContent('not stated');
    expect(screen.getByRole('row', { name: /Safety S-1/ })).toHaveTextContent('expired');
    expect(screen.getByRole('img', { name: /Derating: 250 mW up to 70 °C/ })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Find its parts' })).toHaveAttribute('href', '/find?family=7');
  });

  it('say of an earlier revision that it is not in force any more, and which is', async () => {
    renderApplication('/families/7?revision=1');
    expect(await screen.findByText('Not in force any more.')).toBeVisible();
    expect(screen.getByRole('link', { name: 'revision 2' })).toHaveAttribute('href', '/families/7');
    expect(screen.getByRole('heading', { name: 'Revision 1' })).toBeVisible();
  });
});
