import { join } from 'node:path';
import { DIVIDER, found, row } from '../support/find';
import type { Role } from '../support/people';
import { ready } from '../support/ready';
import { searchParts } from '../support/requests';
import { type Desk, expect, test } from '../support/test';
import { takePicture } from './take-picture';

const FOLDER = join(__dirname, '../screenshots');
const WIDE = { width: 1440, height: 900 };
const NARROW = { width: 390, height: 844 };

interface Picture {
  name: string;
  role: Role;
  colorScheme: 'light' | 'dark';
  viewport: { width: number; height: number };
  /** Brings the screen to what is to be seen. */
  show: (desk: Desk) => Promise<void>;
}

const showFind = async ({ page }: Desk): Promise<void> => {
  await page.goto(DIVIDER);
  await found(page);
};

const showSheet = async (desk: Desk): Promise<void> => {
  await showFind(desk);
  await row(desk.page, 0).click();
  const sheet = desk.page.getByRole('complementary', { name: 'Assessment' });
  await expect(sheet.getByRole('button', { name: /^Dissipation/ })).toBeVisible();
};

/** What DIVIDER states, as the server takes it. */
const DIVIDER_DUTY = {
  window: { lower: 4500, upper: 4900 },
  load: { voltage: { min: 0, max: 12 } },
  ambient: { min: -20, max: 70 },
  life: { hours: 87_660 },
};

const showPart = async (desk: Desk): Promise<void> => {
  const parts = await searchParts(desk, { duty: DIVIDER_DUTY, filters: { technologies: ['metal-film'] } });
  await desk.page.goto(DIVIDER.replace('/find', `/parts/${parts[0]?.id ?? ''}`));
  await expect(desk.page.getByRole('region', { name: 'Held against the duty' })).toBeVisible();
};

const showFamily = async ({ page }: Desk): Promise<void> => {
  await page.goto('/families');
  await ready(page);
  await page.getByRole('main').getByRole('link').first().click();
  await expect(page).toHaveURL(/\/families\/\d+/);
};

const PICTURES: Picture[] = [
  { name: 'find-light', role: 'designer', colorScheme: 'light', viewport: WIDE, show: showFind },
  { name: 'find-dark-assessment', role: 'designer', colorScheme: 'dark', viewport: WIDE, show: showSheet },
  { name: 'part-light', role: 'component-engineer', colorScheme: 'light', viewport: WIDE, show: showPart },
  { name: 'family-light', role: 'librarian', colorScheme: 'light', viewport: WIDE, show: showFamily },
  { name: 'find-phone-light', role: 'designer', colorScheme: 'light', viewport: NARROW, show: showFind },
  { name: 'part-phone-dark', role: 'designer', colorScheme: 'dark', viewport: NARROW, show: showPart },
];

for (const { name, role, show, ...look } of PICTURES) {
  test(name, async ({ signIn }) => {
    const desk = await signIn(role, { ...look, reducedMotion: 'reduce' });
    await show(desk);
    await ready(desk.page);
    await desk.page.evaluate(() => document.fonts.ready);
    await takePicture(desk.page, join(FOLDER, `${name}.png`));
  });
}
