const browsers: readonly (readonly [RegExp, string])[] = [
  [/\bEdg\//, 'Edge'],
  [/\bFirefox\//, 'Firefox'],
  [/\b(?:Headless)?Chrome\//, 'Chrome'],
  [/\bSafari\//, 'Safari'],
];

const systems: readonly (readonly [RegExp, string])[] = [
  [/\bAndroid\b/, 'Android'],
  [/\biPhone\b|\biPad\b/, 'iOS'],
  [/\bWindows\b/, 'Windows'],
  [/\bMac OS X\b/, 'macOS'],
  [/\bLinux\b/, 'Linux'],
];

const first = (list: readonly (readonly [RegExp, string])[], text: string): string | undefined =>
  list.find(([pattern]) => pattern.test(text))?.[1];

/** `Firefox on Linux`, from what a browser says of itself; its own words where they name none that is known. */
export function browserWords(userAgent: string): string {
  const browser = first(browsers, userAgent);
  const system = first(systems, userAgent);
  if (browser === undefined) return userAgent === '' ? 'A browser that does not say which' : userAgent;
  return system === undefined ? browser : `${browser} on ${system}`;
}
