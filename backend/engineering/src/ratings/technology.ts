/** Element technologies the catalogue distinguishes (engineering.md, the HTTP contract). */
export const technologies = [
  'thick-film',
  'thin-film',
  'metal-film',
  'carbon-film',
  'metal-oxide',
  'wirewound',
  'metal-strip',
  'metal-foil',
  'carbon-composition',
  'ceramic-composition',
] as const;
export type Technology = (typeof technologies)[number];

/** How the body is fixed. */
export const mountings = ['surface', 'through-hole', 'chassis'] as const;
export type Mounting = (typeof mountings)[number];

/** Properties a family claims in its datasheet. */
export const features = [
  'automotive',
  'sulphur-resistant',
  'pulse-proof',
  'flameproof',
  'fusible',
  'low-inductance',
  'non-magnetic',
] as const;
export type Feature = (typeof features)[number];

export const approvals = ['draft', 'in-review', 'approved', 'preferred', 'restricted', 'withdrawn'] as const;
export type Approval = (typeof approvals)[number];

export const supplyStatuses = ['active', 'not-recommended', 'last-time-buy', 'discontinued'] as const;
export type SupplyStatus = (typeof supplyStatuses)[number];

/** Technologies whose load-life drift scales with time and temperature (common practice for metal and thin films). */
export const scalingDriftTechnologies: ReadonlySet<Technology> = new Set(['thin-film', 'metal-film']);
