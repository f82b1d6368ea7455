import { type BrowserContext, type BrowserContextOptions, type Page, test as base } from '@playwright/test';
import { type Role, personWith } from './people';
import { serverUrl } from './server-url';

export { expect } from '@playwright/test';

/** Somebody at a browser of their own. */
export interface Desk {
  page: Page;
  context: BrowserContext;
  /** For requests past the pages, as a program would send them. */
  accessToken: string;
}

interface Fixtures {
  /** Signs a person of the demonstration in, in a browser context that no other test or person shares. */
  signIn: (role: Role, options?: BrowserContextOptions) => Promise<Desk>;
  /** A browser context that belongs to nobody yet. */
  openContext: (options?: BrowserContextOptions) => Promise<BrowserContext>;
}

export const test = base.extend<Fixtures>({
  openContext: async ({ browser, contextOptions }, use) => {
    const opened: BrowserContext[] = [];
    await use(async (options) => {
      const context = await browser.newContext({ ...contextOptions, baseURL: serverUrl(), ...options });
      opened.push(context);
      return context;
    });
    for (const context of opened) await context.close();
  },
  signIn: async ({ openContext }, use) => {
    await use(async (role, options) => {
      const context = await openContext(options);
      const { email, password } = personWith(role);
      const answer = await context.request.post('/api/auth/sign-in', { data: { email, password } });
      if (!answer.ok()) throw new Error(`Signing in as ${role} was refused: ${await answer.text()}`);
      const { accessToken } = (await answer.json()) as { accessToken: string };
      // The context keeps the cookie of the session, with which any page it opens is signed in.
      return { context, accessToken, page: await context.newPage() };
    });
  },
});
