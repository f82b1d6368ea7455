import type { BudgetLine } from '@resistry/engineering/budget/budget';
import { screen } from '@testing-library/react';
import { renderInTheme } from '../../test-support/render-in-theme';
import { BudgetBar } from './budget-bar';

const lines: BudgetLine[] = [
  { contribution: 'tolerance', amount: 0.01, basis: 'tolerance at delivery, as rated', missing: [] },
  { contribution: 'temperature', amount: 0.005, basis: 'TCR × 50.0 K', missing: [] },
  { contribution: 'humidity', amount: null, basis: 'the datasheet gives none', missing: ['humidityShift'] },
];

describe('the deviation budget', () => {
  it('adds what is known and says that it is incomplete', () => {
    renderInTheme(<BudgetBar lines={lines} allowance={0.0426} adds />);
    // 1 % + 0.5 % = 1.5 %.
    expect(screen.getByText(/1\.5 % known of the 4\.26 %/)).toHaveTextContent('Incomplete: 1 of 3');
  });

  it('never shows a missing contribution as nothing', () => {
    renderInTheme(<BudgetBar lines={lines} allowance={null} adds />);
    const [, , humidity] = screen.getAllByRole('listitem');
    expect(humidity).toHaveTextContent('not stated');
    expect(humidity).not.toHaveTextContent('0 %');
  });

  it('draws no sum where deviations do not add', () => {
    renderInTheme(<BudgetBar lines={lines} allowance={0.0426} adds={false} />);
    expect(screen.queryByText(/known/)).not.toBeInTheDocument();
  });
});
