import { approvalCheck } from './approval';
import { bodyCheck } from './body';
import { categoryTemperatureCheck } from './category-temperature';
import { certificateCheck } from './certificate';
import type { CheckDefinition, CheckName } from './check';
import { dissipationCheck } from './dissipation';
import { elementTemperatureCheck } from './element-temperature';
import { featuresCheck } from './features';
import { insulationCheck } from './insulation';
import { linkCurrentCheck } from './link-current';
import { linkResistanceCheck } from './link-resistance';
import { mountingCheck } from './mounting';
import {
  frequencyCheck,
  noiseCheck,
  pulseVoltageCheck,
  repeatedPulseCheck,
  singlePulseCheck,
} from './not-computed';
import { secondSourceCheck } from './second-source';
import { supplyCheck } from './supply';
import { valueCheck } from './value';
import { voltageCheck } from './voltage';

/** Every check, in the order in which an assessment lists them. */
export const checkList: readonly CheckDefinition[] = [
  valueCheck,
  dissipationCheck,
  elementTemperatureCheck,
  voltageCheck,
  singlePulseCheck,
  repeatedPulseCheck,
  pulseVoltageCheck,
  insulationCheck,
  categoryTemperatureCheck,
  noiseCheck,
  frequencyCheck,
  linkCurrentCheck,
  linkResistanceCheck,
  bodyCheck,
  mountingCheck,
  featuresCheck,
  certificateCheck,
  approvalCheck,
  supplyCheck,
  secondSourceCheck,
];

/** Checks that are answered from the part's standing in the catalogue, not from its ratings. */
export const standingChecks: ReadonlySet<CheckName> = new Set(['approval', 'supply', 'second-source']);
