import { EVERYTHING, found, results } from '../support/find';
import { quantile } from '../support/quantile';
import { reportFigure } from '../support/report-figure';
import { expect, test } from '../support/test';

const ROWS = 10_000;
const FRAMES = 600;
const LONGEST_MILLISECONDS = 25;

test('ten thousand rows scroll smoothly', async ({ signIn }) => {
  const { page } = await signIn('designer');
  await page.goto(EVERYTHING);
  await found(page);
  expect(Number(await results(page).getAttribute('aria-rowcount'))).toBeGreaterThan(ROWS);
  const frames = await results(page).evaluate(
    async (grid, { rows, count }) => {
      let scroller: Element | null = grid;
      while (scroller !== null && scroller.scrollHeight <= scroller.clientHeight + 1)
        scroller = scroller.parentElement;
      if (scroller === null) throw new Error('Nothing scrolls.');
      const rowHeight = grid.querySelector('[aria-rowindex]')?.getBoundingClientRect().height ?? 0;
      const step = (rows * rowHeight) / count;
      const frame = () => new Promise<number>((resolve) => requestAnimationFrame(resolve));
      const durations: number[] = [];
      let before = await frame();
      for (let each = 0; each < count; each += 1) {
        scroller.scrollBy(0, step);
        const now = await frame();
        durations.push(now - before);
        before = now;
      }
      return durations;
    },
    { rows: ROWS, count: FRAMES },
  );
  const p95 = quantile(frames, 0.95);
  reportFigure('Frame while scrolling, p95 in ms', p95, `under ${LONGEST_MILLISECONDS}`);
  expect(p95).toBeLessThan(LONGEST_MILLISECONDS);
});
