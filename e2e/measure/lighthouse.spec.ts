import { expect, test } from '@playwright/test';
import { DIVIDER } from '../support/find';
import { rate } from '../support/lighthouse';
import { reportFigure } from '../support/report-figure';

const LOWEST_SCORE = 0.95;

test('Find is quick to load', async () => {
  const { scores, faults } = await rate(DIVIDER, 'designer', ['performance']);
  reportFigure('Lighthouse performance on Find', scores.performance ?? NaN, `at least ${LOWEST_SCORE}`);
  expect(scores.performance, faults.join('; ')).toBeGreaterThanOrEqual(LOWEST_SCORE);
});
