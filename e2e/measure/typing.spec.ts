import { DIVIDER, found } from '../support/find';
import { quantile } from '../support/quantile';
import { reportFigure } from '../support/report-figure';
import { expect, test } from '../support/test';

const LONGEST_MILLISECONDS = 200;
/** Each finds more parts than the one before, and no answer to it is kept yet. */
const UPPER_ENDS = Array.from({ length: 30 }, (_, place) => `${5 + place}k1`);
/** Until then the server, which was started for this, still compiles what it runs. */
const WARMING_UP = 10;

/** Where the page keeps what is being measured in it. */
interface Measuring {
  delay?: Promise<number>;
}

test('rows follow the typing', async ({ signIn }) => {
  const { page } = await signIn('designer');
  await page.goto(DIVIDER);
  await found(page);
  const highest = page.getByRole('textbox', { name: 'Highest' });
  const heading = page.getByRole('heading', { level: 1 });
  const delays: number[] = [];
  for (const text of UPPER_ENDS) {
    await heading.evaluate((element) => {
      const before = element.textContent;
      (window as Measuring).delay = new Promise((resolve) => {
        let typed = NaN;
        document.addEventListener('input', (event) => (typed = event.timeStamp), {
          capture: true,
          once: true,
        });
        const observer = new MutationObserver(() => {
          if (element.textContent === before) return;
          observer.disconnect();
          // The frame in which it is seen.
          requestAnimationFrame((now) => resolve(now - typed));
        });
        observer.observe(element, { subtree: true, childList: true, characterData: true });
      });
    });
    await highest.fill(text);
    delays.push(await page.evaluate(() => (window as Measuring).delay ?? NaN));
    await found(page);
  }
  const p95 = quantile(delays.slice(WARMING_UP), 0.95);
  reportFigure('From the last key to the rows, p95 in ms', p95, `under ${LONGEST_MILLISECONDS}`);
  expect(p95).toBeLessThan(LONGEST_MILLISECONDS);
});
