import AxeBuilder from '@axe-core/playwright';
import { type Page, expect } from '@playwright/test';

const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/** Holds a page, as it stands, to the accessibility rules, naming each element that breaks one; the test goes on. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).withTags(RULES).analyze();
  const broken = violations.flatMap(({ id, help, nodes }) =>
    nodes.map(
      ({ target, failureSummary }) => `${id} (${help}) at ${target.join(' ')}: ${failureSummary ?? ''}`,
    ),
  );
  expect.soft(broken, page.url()).toEqual([]);
}
