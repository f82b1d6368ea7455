/** Each colour of the interface, for light paper and for dark, with the same hierarchy in both. */
export interface ColourPair {
  light: string;
  dark: string;
}

/** Grounds, from the page to what lies on it. */
export const grounds = {
  page: { light: '#f8f5ee', dark: '#14191d' },
  sheet: { light: '#fffdf8', dark: '#1a2126' },
  field: { light: '#fffefb', dark: '#11161a' },
  selected: { light: '#e3e8e1', dark: '#1a2b2d' },
  basis: { light: '#eff3ed', dark: '#1e2b2f' },
  hover: { light: '#f1ede3', dark: '#1a2025' },
} satisfies Record<string, ColourPair>;

/** Inks. Every one of them has a contrast of at least 4.5 to 1 on every ground above (colours.test.ts). */
export const inks = {
  ink: { light: '#1d2830', dark: '#ece6da' },
  muted: { light: '#56626a', dark: '#a3adb3' },
  accent: { light: '#17695f', dark: '#62bfaf' },
  met: { light: '#17695f', dark: '#62bfaf' },
  unmet: { light: '#a3291d', dark: '#f08a78' },
  unrated: { light: '#5a6068', dark: '#a9b0b6' },
  preferred: { light: '#17695f', dark: '#62bfaf' },
  caution: { light: '#805008', dark: '#dfa94a' },
} satisfies Record<string, ColourPair>;

/** Lines: hairlines between rows are decoration; the border of a field bounds a control and needs 3 to 1. */
export const lines = {
  hairline: { light: '#ddd6c8', dark: '#2d373e' },
  track: { light: '#e4dfd3', dark: '#2a343a' },
  field: { light: '#8b8a80', dark: '#6b777e' },
} satisfies Record<string, ColourPair>;
