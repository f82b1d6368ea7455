import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium } from '@playwright/test';
import { LAUNCH_OPTIONS, FLAGS } from './chromium';
import { freePort } from './free-port';
import { type Role, personWith } from './people';
import { serverUrl } from './server-url';

export type Category = 'performance' | 'accessibility';

export interface Scores {
  /** From 0 to 1. */
  scores: Record<Category, number | null | undefined>;
  /** What took a point off, in words. */
  faults: string[];
}

/**
 * Rates a page as somebody who is signed in sees it on a desktop computer.
 *
 * @throws Error when the page cannot be rated
 */
export async function rate(path: string, role: Role, categories: readonly Category[]): Promise<Scores> {
  const profile = mkdtempSync(join(tmpdir(), 'resistry-browser-'));
  const port = await freePort();
  // Lighthouse opens pages of its own in the browser's first context, so that is the one to be signed in.
  const context = await chromium.launchPersistentContext(profile, {
    ...LAUNCH_OPTIONS,
    args: [...FLAGS, `--remote-debugging-port=${port}`],
  });
  try {
    const { email, password } = personWith(role);
    const signIn = await context.request.post(`${serverUrl()}/api/auth/sign-in`, {
      data: { email, password },
    });
    if (!signIn.ok()) throw new Error(`Signing in was refused: ${await signIn.text()}`);
    const { default: lighthouse, desktopConfig } = await import('lighthouse');
    const flags = {
      port,
      disableStorageReset: true,
      onlyCategories: [...categories],
      logLevel: 'error' as const,
    };
    const result = await lighthouse(`${serverUrl()}${path}`, flags, desktopConfig);
    if (result === undefined) throw new Error('There is no result.');
    const { categories: rated, audits, runtimeError } = result.lhr;
    if (runtimeError !== undefined) throw new Error(runtimeError.message);
    const references = Object.values(rated).flatMap(({ auditRefs }) => auditRefs);
    const faults = references
      .filter(({ id, weight }) => weight > 0 && (audits[id]?.score ?? 1) < 1)
      .map(({ id }) => `${audits[id]?.title ?? id}: ${audits[id]?.displayValue ?? 'not met'}`);
    return {
      scores: { performance: rated['performance']?.score, accessibility: rated['accessibility']?.score },
      faults,
    };
  } finally {
    await context.close();
    rmSync(profile, { recursive: true, force: true });
  }
}
