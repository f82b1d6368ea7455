import { bodyMarking } from '@resistry/engineering/marking/body-marking';
import { colourSrgb } from '@resistry/engineering/marking/colour-srgb';
import { screen } from '@testing-library/react';
import { renderInTheme } from '../../test-support/render-in-theme';
import { type DrawnBody, bodyFrame } from './drawn-body';
import { DrawnPart } from './drawn-part';

const chip: DrawnBody = {
  style: 'chip',
  length: 3.2e-3,
  width: 1.6e-3,
  marking: bodyMarking({
    resistance: 4700,
    tolerance: 0.01,
    style: 'chip',
    size: '1206/3216M',
    isLink: false,
  }),
};

const axial: DrawnBody = {
  style: 'axial',
  length: 6.3e-3,
  width: 2.5e-3,
  marking: bodyMarking({ resistance: 4700, tolerance: 0.05, style: 'axial', size: '0207', isLink: false }),
};

describe('a drawn part', () => {
  it('keeps the proportion of the body: 3.2 mm by 1.6 mm is two to one', () => {
    const frame = bodyFrame(chip, { width: 62, height: 26 });
    expect(frame.width / frame.height).toBeCloseTo(2, 10);
    expect(frame.height).toBeLessThanOrEqual(26);
  });

  it('leaves room for the leads', () => {
    const frame = bodyFrame(axial, { width: 62, height: 26 });
    expect(frame.x - frame.width * 0.42).toBeGreaterThanOrEqual(-1e-9);
  });

  it('bears the characters of IEC 60062 on a chip: 4.7 kΩ ±1 % is 4701', () => {
    renderInTheme(<DrawnPart body={chip} size="page" labelled />);
    expect(screen.getByRole('img', { name: 'marked 4701' })).toHaveTextContent('4701');
  });

  it('bears the bands of IEC 60062 in order: 4.7 kΩ ±5 % is yellow, violet, red, gold', () => {
    const { container } = renderInTheme(<DrawnPart body={axial} labelled />);
    expect(screen.getByRole('img', { name: 'banded yellow, violet, red, gold' })).toBeInTheDocument();
    const bands = [...container.querySelectorAll('rect')].sort(
      (a, b) => Number(a.getAttribute('x')) - Number(b.getAttribute('x')),
    );
    expect(bands.map((band) => band.getAttribute('fill'))).toEqual(
      (['yellow', 'violet', 'red', 'gold'] as const).map((colour) => colourSrgb[colour]),
    );
  });
});
