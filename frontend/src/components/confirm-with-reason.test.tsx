import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { Problem } from '../api/problem';
import { renderInTheme } from '../test-support/render-in-theme';
import { ConfirmWithReason } from './confirm-with-reason';

const withdrawal = {
  title: 'Withdraw BW-R-00122',
  description: 'It leaves the defaults of Find.',
  act: 'Withdraw it',
  initialValues: {},
};

describe('a change that needs a reason', () => {
  it('is not made without one', async () => {
    const confirm = jest.fn().mockResolvedValue(undefined);
    renderInTheme(<ConfirmWithReason {...withdrawal} error={null} onConfirm={confirm} onClose={jest.fn()} />);
    await userEvent.click(screen.getByRole('button', { name: 'Withdraw it' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('Say why');
    expect(confirm).not.toHaveBeenCalled();
  });

  it('is made with one, and the dialog closes', async () => {
    const confirm = jest.fn().mockResolvedValue(undefined);
    const close = jest.fn();
    renderInTheme(<ConfirmWithReason {...withdrawal} error={null} onConfirm={confirm} onClose={close} />);
    await userEvent.type(screen.getByRole('textbox', { name: 'Reason' }), ' cracks in salt fog ');
    await userEvent.click(screen.getByRole('button', { name: 'Withdraw it' }));
    await waitFor(() => expect(close).toHaveBeenCalled());
    expect(confirm).toHaveBeenCalledWith({ reason: 'cracks in salt fog' });
  });

  it('keeps what was typed when the server refuses', async () => {
    const refusal = new Problem(
      'forbidden',
      403,
      'Not allowed',
      undefined,
      'r',
      [],
      'None that he or she entered.',
    );
    const confirm = jest.fn().mockRejectedValue(refusal);
    const close = jest.fn();
    renderInTheme(<ConfirmWithReason {...withdrawal} error={refusal} onConfirm={confirm} onClose={close} />);
    await userEvent.type(screen.getByRole('textbox', { name: 'Reason' }), 'worn out');
    await userEvent.click(screen.getByRole('button', { name: 'Withdraw it' }));
    await waitFor(() => expect(confirm).toHaveBeenCalled());
    expect(screen.getByRole('textbox', { name: 'Reason' })).toHaveValue('worn out');
    expect(screen.getByRole('alert')).toHaveTextContent('None that he or she entered.');
    expect(close).not.toHaveBeenCalled();
  });
});
