import type { Page } from '@playwright/test';
import { EVERYTHING, found, results } from '../support/find';
import { quantile } from '../support/quantile';
import { reportFigure } from '../support/report-figure';
import { expect, test } from '../support/test';

const ROWS = 10_000;
const FRAMES = 600;
const LONGEST_MILLISECONDS = 25;

/** As fast as the eye can follow: the rows come while they scroll. */
const READ_ROWS = 1_500;
const JUDGED = `${EVERYTHING}&lower=1&upper=1M&voltage=0..12&ambient=-20..70&life=10+years`;

/** Scrolls so many rows in so many frames. @returns how long each frame took, ms */
function scroll(page: Page, rows: number): Promise<number[]> {
  return results(page).evaluate(
    async (grid, { rows: passed, count }) => {
      let scroller: Element | null = grid;
      while (scroller !== null && scroller.scrollHeight <= scroller.clientHeight + 1)
        scroller = scroller.parentElement;
      if (scroller === null) throw new Error('Nothing scrolls.');
      const rowHeight = grid.querySelector('tbody [aria-rowindex]')?.getBoundingClientRect().height ?? 0;
      const step = (passed * rowHeight) / count;
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
    { rows, count: FRAMES },
  );
}

for (const [how, address, rows] of [
  ['flying past', EVERYTHING, ROWS],
  ['reading', JUDGED, READ_ROWS],
] as const) {
  test(`${rows} rows scroll smoothly, ${how}`, async ({ signIn }) => {
    const { page } = await signIn('designer');
    await page.goto(address);
    await found(page);
    expect(Number(await results(page).getAttribute('aria-rowcount'))).toBeGreaterThan(rows);
    const p95 = quantile(await scroll(page, rows), 0.95);
    reportFigure(`Frame while scrolling ${rows} rows, p95 in ms`, p95, `under ${LONGEST_MILLISECONDS}`);
    expect(p95).toBeLessThan(LONGEST_MILLISECONDS);
  });
}
