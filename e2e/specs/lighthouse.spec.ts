import { expect, test } from '@playwright/test';
import { DIVIDER } from '../support/find';
import { rate } from '../support/lighthouse';

test('Find has every point for accessibility', async () => {
  const { scores, faults } = await rate(DIVIDER, 'designer', ['accessibility']);
  expect(faults).toEqual([]);
  expect(scores.accessibility).toBe(1);
});
