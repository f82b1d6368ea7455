import { render } from '@testing-library/react';
import { Formula } from './formula';

describe('a formula', () => {
  it('sets what follows an underscore as an index', () => {
    const { container } = render(<Formula text="P = U² / R_low ≤ P_rated · min(policy line, curve)" />);
    expect(container.innerHTML).toBe(
      'P = U² / R<sub>low</sub> ≤ P<sub>rated</sub> · min(policy line, curve)',
    );
  });

  it('leaves one without indices as it is', () => {
    const { container } = render(<Formula text="Σ|ΔR/R| ≤ a" />);
    expect(container.innerHTML).toBe('Σ|ΔR/R| ≤ a');
  });
});
