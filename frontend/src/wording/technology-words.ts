import type { Feature, Mounting, Technology } from '@resistry/engineering/ratings/technology';

export const technologyWords: Record<Technology, string> = {
  'thick-film': 'Thick film',
  'thin-film': 'Thin film',
  'metal-film': 'Metal film',
  'carbon-film': 'Carbon film',
  'metal-oxide': 'Metal oxide',
  wirewound: 'Wirewound',
  'metal-strip': 'Metal strip',
  'metal-foil': 'Metal foil',
  'carbon-composition': 'Carbon composition',
  'ceramic-composition': 'Ceramic composition',
};

export const mountingWords: Record<Mounting, string> = {
  surface: 'Surface',
  'through-hole': 'Through hole',
  chassis: 'Chassis',
};

export const featureWords: Record<Feature, string> = {
  automotive: 'Automotive',
  'sulphur-resistant': 'Sulphur resistant',
  'pulse-proof': 'Pulse proof',
  flameproof: 'Flameproof',
  fusible: 'Fusible',
  'low-inductance': 'Low inductance',
  'non-magnetic': 'Non-magnetic',
};
