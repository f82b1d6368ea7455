import type { LaunchOptions } from '@playwright/test';

/** Debian's browser; none is downloaded. */
export const CHROMIUM = '/usr/bin/chromium';

/** As root it runs only without its sandbox; the rest keeps it from calling home and from needing a graphics card. */
export const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export const LAUNCH_OPTIONS: LaunchOptions = { executablePath: CHROMIUM, args: FLAGS };
