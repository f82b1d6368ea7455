import { DIVIDER, found } from '../support/find';
import { quantile } from '../support/quantile';
import { reportFigure } from '../support/report-figure';
import { expect, test } from '../support/test';

const LONGEST_MILLISECONDS = 200;
/** Each asks something that no answer is kept of yet. */
const UPPER_ENDS = Array.from({ length: 20 }, (_, place) => `${5 + place}k1`);

test('rows follow the typing', async ({ signIn }) => {
  const { page } = await signIn('designer');
  await page.goto(DIVIDER);
  await found(page);
  const highest = page.getByRole('textbox', { name: 'Highest' });
  const heading = page.getByRole('heading', { level: 1 });
  const delays: number[] = [];
  for (const text of UPPER_ENDS) {
    await highest.fill('');
    await found(page);
    const before = await heading.innerText();
    const changed = heading.evaluate(
      (element, words) =>
        new Promise<number>((resolve) => {
          let typed = NaN;
          document.addEventListener('input', (event) => (typed = event.timeStamp), {
            capture: true,
            once: true,
          });
          const observer = new MutationObserver(() => {
            if (element.textContent === words) return;
            observer.disconnect();
            // The frame in which it is seen.
            requestAnimationFrame((now) => resolve(now - typed));
          });
          observer.observe(element, { subtree: true, childList: true, characterData: true });
        }),
      before,
    );
    await highest.fill(text);
    delays.push(await changed);
  }
  const p95 = quantile(delays, 0.95);
  reportFigure('From the last key to the rows, p95 in ms', p95, `under ${LONGEST_MILLISECONDS}`);
  expect(p95).toBeLessThan(LONGEST_MILLISECONDS);
});
