import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { startSession } from '../../api/session';
import { examplePartDetails } from '../../test-support/part-details';
import { renderApplication } from '../../test-support/render-application';
import { type Answer, serve } from '../../test-support/serve';
import { sessionOf } from '../../test-support/session-of';

const read = { action: 'read', subject: ['Part', 'Policy', 'Offer'] };
const packagings = [
  { packaging: 'T', description: 'paper tape', quantity: 5000, code: 'ODF1206-T' },
  { packaging: 'B', description: 'bulk', quantity: 1000 },
];
let sent: { method?: string; url?: string; data: unknown }[];
let answer: Answer;

const openAs = (rules: (typeof read)[]): void => {
  startSession(sessionOf(['purchasing'], [read, ...rules]));
  renderApplication('/parts/122');
};

beforeEach(() => {
  sent = [];
  answer = { status: 201, data: {} };
  serve(({ method, url, data }) => {
    if (url?.startsWith('/offers') === true) {
      sent.push({ method, url, data: JSON.parse(String(data)) as unknown });
      return answer;
    }
    switch (url) {
      case '/policies':
        return { status: 200, data: { items: [] } };
      case '/parts/122':
        return { status: 200, data: examplePartDetails({ orderingCodes: packagings }) };
      case '/suppliers':
        return { status: 200, data: { items: [{ id: 2, code: 'MAR', name: 'Marram Supply' }] } };
      default:
        return { status: 404, data: {} };
    }
  });
});

describe('the offers of a part', () => {
  it('are only read by whoever may not change them', async () => {
    openAs([]);
    expect(await screen.findByRole('table', { name: 'Offers, € a piece' })).toHaveTextContent('0.0060');
    expect(screen.queryByRole('button', { name: 'Enter an offer' })).not.toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'End' })).not.toBeInTheDocument();
  });

  it('are entered with everything that an offer needs', async () => {
    openAs([{ action: 'manage', subject: ['Offer'] }]);
    await userEvent.click(await screen.findByRole('button', { name: 'Enter an offer' }));
    const dialog = await screen.findByRole('dialog', { name: 'Enter the offer' });
    await userEvent.click(within(dialog).getByRole('button', { name: 'Enter the offer' }));
    expect(await within(dialog).findByText('Choose the supplier.')).toBeVisible();
    expect(sent).toEqual([]);
    await within(dialog).findByRole('option', { name: 'Marram Supply' });
    await userEvent.selectOptions(within(dialog).getByLabelText('Supplier'), 'Marram Supply');
    await userEvent.selectOptions(within(dialog).getByLabelText('Packaging'), 'B');
    await userEvent.type(within(dialog).getByLabelText('Smallest order, pieces'), '100');
    await userEvent.type(within(dialog).getByLabelText('In multiples of'), '100');
    await userEvent.type(within(dialog).getByLabelText('Valid from'), '2026-12-01');
    await userEvent.type(within(dialog).getByLabelText('Valid until'), '2027-05-31');
    await userEvent.type(within(dialog).getByLabelText('Lead time, days'), '14');
    const prices = within(dialog).getByLabelText(/^Prices/);
    await userEvent.type(prices, '100 0,0092{Enter}1000 0.0069');
    expect(within(dialog).getByText('from 100: € 0.0092; from 1,000: € 0.0069')).toBeVisible();
    await userEvent.type(within(dialog).getByLabelText('Reason'), 'Quotation 4711');
    await userEvent.click(within(dialog).getByRole('button', { name: 'Enter the offer' }));
    await waitFor(() => expect(dialog).not.toBeInTheDocument());
    expect(sent).toEqual([
      {
        method: 'post',
        url: '/offers',
        data: {
          partId: 122,
          supplierId: 2,
          packaging: 'B',
          minimumOrder: 100,
          orderMultiple: 100,
          leadTimeDays: 14,
          validFrom: '2026-12-01',
          validUntil: '2027-05-31',
          priceBreaks: [
            { quantity: 100, unitPrice: 0.0092 },
            { quantity: 1000, unitPrice: 0.0069 },
          ],
          reason: 'Quotation 4711',
        },
      },
    ]);
  });

  it('are changed from what they are, and a refusal stands at its entry', async () => {
    answer = {
      status: 422,
      data: { title: 'It clashes', errors: [{ pointer: '/priceBreaks/0/unitPrice', message: 'Too dear.' }] },
    };
    openAs([{ action: 'manage', subject: ['Offer'] }]);
    await userEvent.click(await screen.findByRole('button', { name: 'Change' }));
    const dialog = await screen.findByRole('dialog', { name: 'Change the offer' });
    expect(within(dialog).getByLabelText(/^Prices/)).toHaveValue('1000 0.006');
    await userEvent.type(within(dialog).getByLabelText('Reason'), 'New list');
    await userEvent.click(within(dialog).getByRole('button', { name: 'Change the offer' }));
    expect(await within(dialog).findByText('Too dear.')).toBeVisible();
    expect(within(dialog).getByLabelText('Reason')).toHaveValue('New list');
    expect(sent[0]).toMatchObject({
      method: 'put',
      url: '/offers/1',
      data: { version: 1, leadTimeDays: 14, reason: 'New list' },
    });
  });

  it('are ended with a reason', async () => {
    openAs([{ action: 'manage', subject: ['Offer'] }]);
    await userEvent.click(await screen.findByRole('button', { name: 'End' }));
    const dialog = await screen.findByRole('dialog', { name: 'End the offer' });
    await userEvent.type(within(dialog).getByLabelText('Reason'), 'Supplier closed');
    await userEvent.click(within(dialog).getByRole('button', { name: 'End the offer' }));
    await waitFor(() => expect(dialog).not.toBeInTheDocument());
    expect(sent).toEqual([
      { method: 'post', url: '/offers/1/end', data: { reason: 'Supplier closed', version: 1 } },
    ]);
  });
});
