import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import { deratingLines } from './derating-lines';

const curve = {
  axis: 'ambient',
  points: [
    [70, 1],
    [155, 0],
  ],
} as const;

describe('the lines of a derating chart', () => {
  it('are level from the coldest temperature to the knee', () => {
    const { manufacturer, temperatures, levelTo } = deratingLines(0.25, curve, undefined, -55);
    expect(manufacturer).toEqual([
      [-55, 0.25],
      [70, 0.25],
      [155, 0],
    ]);
    expect(temperatures).toEqual([-55, 155]);
    expect(levelTo).toBe(70);
  });

  it('are level to where a curve of several slopes begins to fall, or to its end', () => {
    const points = [
      [25, 1],
      [70, 1],
      [125, 0.5],
      [155, 0],
    ] as const;
    expect(deratingLines(1, { axis: 'ambient', points }, undefined, -55).levelTo).toBe(70);
    const level = { axis: 'case', points: [[85, 1]] } as const;
    expect(deratingLines(1, level, undefined, -55).levelTo).toBe(85);
  });

  it('follow the policy, and never rise above the manufacturer', () => {
    const entry: PolicyEntry = { match: {}, powerRatio: 0.6, reading: 'multiplied', voltageRatio: 0.8 };
    const { policy = [], manufacturer } = deratingLines(0.25, curve, entry, -55);
    // 0.6 × 0.25 W at 70 °C and 0 W at 155 °C.
    expect(policy.find(([celsius]) => celsius === 70)?.[1]).toBeCloseTo(0.15, 12);
    expect(policy[policy.length - 1]?.[1]).toBe(0);
    expect(Math.max(...policy.map(([, watt]) => watt))).toBeLessThan(
      Math.max(...manufacturer.map(([, watt]) => watt)),
    );
  });

  it('stop where the policy allows nothing more', () => {
    const entry: PolicyEntry = {
      match: {},
      powerRatio: 0.6,
      reading: 'parallel',
      voltageRatio: 0.8,
      maxTemperature: 100,
    };
    const { policy = [] } = deratingLines(0.25, curve, entry, -55);
    expect(policy.filter(([celsius]) => celsius > 100).every(([, watt]) => watt === 0)).toBe(true);
  });
});
