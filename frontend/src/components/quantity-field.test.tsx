import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import type { Quantity } from '@resistry/engineering/notation/quantity';
import { renderInTheme } from '../test-support/render-in-theme';
import { IntervalField } from './interval-field';
import { QuantityField } from './quantity-field';

function Single({ quantity }: { quantity: Quantity }) {
  const [text, setText] = useState('');
  return <QuantityField label="Lowest" quantity={quantity} text={text} onText={setText} />;
}

function Ends() {
  const [text, setText] = useState('');
  return <IntervalField label="Voltage" quantity="voltage" single="from-zero" text={text} onText={setText} />;
}

describe('a quantity field', () => {
  it('says what it understood while it is typed, and falls silent afterwards', async () => {
    renderInTheme(<Single quantity="resistance" />);
    const field = screen.getByRole('textbox', { name: 'Lowest' });
    await userEvent.type(field, '4k7');
    expect(field).toHaveAccessibleDescription('4k7 → 4.7 kΩ');
    await userEvent.tab();
    expect(screen.queryByRole('status')).not.toBeInTheDocument();
    expect(field).toHaveValue('4k7');
  });

  it('refuses what reads in two ways, at the field and with both readings', async () => {
    renderInTheme(<Single quantity="resistance" />);
    const field = screen.getByRole('textbox', { name: 'Lowest' });
    await userEvent.type(field, '4,700');
    expect(field).toBeInvalid();
    expect(screen.getByRole('alert')).toHaveTextContent(/4\.7 Ω.*4\.7 kΩ/);
  });
});

describe('an interval field', () => {
  it('takes one number as reaching from zero, and says so', async () => {
    renderInTheme(<Ends />);
    const field = screen.getByRole('textbox', { name: 'Voltage' });
    await userEvent.type(field, '24');
    expect(field).toHaveAccessibleDescription('24 → 0 V…24 V');
  });

  it('refuses ends the wrong way round', async () => {
    renderInTheme(<Ends />);
    await userEvent.type(screen.getByRole('textbox', { name: 'Voltage' }), '24..12');
    expect(screen.getByRole('alert')).toBeInTheDocument();
  });
});
