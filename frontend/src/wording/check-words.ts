import type { CheckName, Status } from '@resistry/engineering/checks/check';

/** Checks as the interface names them. */
export const checkWords: Record<CheckName, string> = {
  value: 'Value',
  dissipation: 'Dissipation',
  'element-temperature': 'Element temperature',
  voltage: 'Voltage',
  'single-pulse': 'Single pulse',
  'repeated-pulse': 'Repeated pulse',
  'pulse-voltage': 'Pulse voltage',
  insulation: 'Insulation',
  'category-temperature': 'Category temperature',
  noise: 'Noise',
  frequency: 'Frequency',
  'link-current': 'Link current',
  'link-resistance': 'Link resistance',
  body: 'Body size',
  mounting: 'Mounting',
  features: 'Features',
  certificate: 'Certificate',
  approval: 'Approval',
  supply: 'Supply',
  'second-source': 'Second source',
};

export const statusWords: Record<Status, string> = { met: 'met', unmet: 'not met', unrated: 'unrated' };
