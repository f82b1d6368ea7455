import { screen } from '@testing-library/react';
import { renderInTheme } from '../test-support/render-in-theme';
import { MarginRule } from './margin-rule';
import { demandPosition, positionOf } from './margin-scale';
import { MarginWord } from './margin-word';

const bar = (container: HTMLElement) => container.querySelector('rect');

describe('the margin scale', () => {
  it('gives each doubling the same length', () => {
    const octave = positionOf(2) - positionOf(1);
    expect(positionOf(4) - positionOf(2)).toBeCloseTo(octave, 10);
    expect(positionOf(8) - positionOf(4)).toBeCloseTo(octave, 10);
  });

  it('cuts at its ends and never answers NaN', () => {
    expect(positionOf(0)).toBe(0);
    expect(positionOf(-1)).toBe(0);
    expect(positionOf(1e9)).toBe(100);
  });
});

describe('the margin rule', () => {
  it('draws a met check from the demand to the allowance', () => {
    const { container } = renderInTheme(<MarginRule status="met" margin={1} />);
    expect(bar(container)).toHaveAttribute('x', `${demandPosition}%`);
    expect(bar(container)).toHaveAttribute('width', `${positionOf(2) - demandPosition}%`);
  });

  it('draws an unmet check short of the demand, in another shape', () => {
    const { container } = renderInTheme(<MarginRule status="unmet" margin={-0.25} />);
    expect(bar(container)).toHaveAttribute('x', `${positionOf(0.75)}%`);
    expect(bar(container)).toHaveAttribute('fill', 'none');
  });

  it('hatches an unrated check', () => {
    const { container } = renderInTheme(<MarginRule status="unrated" margin={null} />);
    expect(bar(container)?.getAttribute('fill')).toMatch(/^url\(#/);
  });
});

describe('the margin in words', () => {
  it.each([
    ['met', 0.58, '+58\u202f%'],
    ['unmet', -0.25, '25\u202f% short'],
    ['unrated', null, 'unrated'],
    ['met', null, 'met'],
    ['unmet', null, 'not met'],
  ] as const)('%s with %p says %s', (status, margin, words) => {
    renderInTheme(<MarginWord status={status} margin={margin} />);
    // Not by getByText, whose normalisation would take the narrow space for a plain one.
    expect(screen.getByText(/./).textContent).toBe(words);
  });
});
