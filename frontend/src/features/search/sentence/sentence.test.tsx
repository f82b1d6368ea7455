import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { renderInTheme } from '../../../test-support/render-in-theme';
import type { PolicySummary } from '../../policies/requests/list-policies';
import type { DutyText } from '../duty/duty-text';
import { emptyDutyText } from '../duty/duty-text';
import { readDuty } from '../duty/read-duty';
import { Sentence } from './sentence';
import { sentencePieces } from './sentence-pieces';

const duty: DutyText = {
  ...emptyDutyText,
  entries: { lower: '4k5', upper: '4k9', life: '10 years', voltage: '0…24', ambient: '-20…70' },
};

const policies: PolicySummary[] = [
  { id: 7, name: 'Brackwater', version: 3, origin: 'company', source: '', inForce: true, note: '' },
];

const inWords = (text: DutyText): string =>
  sentencePieces(text, 'Brackwater 3')
    .map((piece) => piece.words)
    .join('');

function Editable() {
  const [text, setText] = useState(duty);
  return <Sentence duty={text} policies={policies} errors={readDuty(text).errors} onChange={setText} />;
}

describe('the duty as a sentence', () => {
  it('says all that is asked, defaults included', () => {
    expect(inWords(duty)).toBe(
      'A resistor that stays between 4.5 kΩ and 4.9 kΩ for 10 years, with up to 24 V across it, at −20 to 70 °C, ' +
        'derated by Brackwater 3; approved or preferred, supply active.',
    );
  });

  it('says little where little is asked', () => {
    expect(inWords({ ...emptyDutyText, supply: [] })).toBe(
      'Any resistor, derated by Brackwater 3; approved or preferred, supply none.',
    );
  });

  it('asks for a link where the lowest is nothing', () => {
    expect(inWords({ ...emptyDutyText, entries: { lower: '0', upper: '10m' } })).toMatch(
      /^A zero-ohm link of at most 10 mΩ/,
    );
  });

  it('lets a number be edited in place', async () => {
    renderInTheme(<Editable />);
    await userEvent.click(screen.getByRole('button', { name: 'Highest: 4.9 kΩ. Change it' }));
    const field = screen.getByRole('textbox', { name: 'Highest' });
    await userEvent.clear(field);
    await userEvent.type(field, '5k1{Enter}');
    expect(screen.getByRole('button', { name: 'Highest: 5.1 kΩ. Change it' })).toBeInTheDocument();
  });

  it('lets the policy be chosen in place, down to the ratings as they are', async () => {
    renderInTheme(<Editable />);
    await userEvent.click(screen.getByRole('button', { name: 'Policy: Brackwater 3. Change it' }));
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Policy' }), 'none');
    expect(screen.getByRole('paragraph')).toHaveTextContent(', by the manufacturer’s ratings as they are');
  });

  it('brings the old number back on Escape', async () => {
    renderInTheme(<Editable />);
    await userEvent.click(screen.getByRole('button', { name: /^Highest/ }));
    await userEvent.type(screen.getByRole('textbox', { name: 'Highest' }), '9{Escape}');
    expect(screen.getByRole('button', { name: 'Highest: 4.9 kΩ. Change it' })).toBeInTheDocument();
  });
});
