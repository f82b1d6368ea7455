import type { PolicyEntry } from './policy-entry';

/** A published derating table as a read-only starting point for a company's own policy. */
export interface AgencyPolicy {
  name: string;
  source: string;
  entries: readonly PolicyEntry[];
}

/** One row of an agency's table; temperatures in °C on the axis of the manufacturer's curve. */
function row(
  style: string,
  powerRatio: number,
  voltageRatio: number,
  from: number,
  zero: number,
  maxTemperature?: number,
  tolerance?: number,
): PolicyEntry {
  return {
    match: { style, ...(tolerance === undefined ? {} : { tolerance }) },
    powerRatio,
    reading: 'parallel',
    from,
    zero,
    voltageRatio,
    ...(maxTemperature === undefined ? {} : { maxTemperature }),
  };
}

/**
 * NASA EEE-INST-002 (May 2003), section R2, Table 4. Wirewound accurate styles are told apart by tolerance, the tightest
 * first. RLR stands at its 100 ppm row; a 350 ppm part has T2 103 °C and T3 125 °C and its own entry under RLR-350.
 */
export const nasaEeeInst002: AgencyPolicy = {
  name: 'NASA EEE-INST-002',
  source: 'NASA EEE-INST-002 (May 2003), section R2, Table 4',
  entries: [
    row('RM', 0.6, 0.8, 70, 118, 150),
    row('RLR', 0.6, 0.8, 70, 118, 150),
    row('RLR-350', 0.6, 0.8, 70, 103, 125),
    row('RNX', 0.6, 0.8, 125, 155, 175),
    row('RZ', 0.6, 0.8, 70, 103, 125),
    row('RBR', 0.25, 0.8, 125, 130, 145, 0.001),
    row('RBR', 0.35, 0.8, 125, 132, 145, 0.005),
    row('RBR', 0.6, 0.8, 125, 137, 145, 0.01),
    row('RWR', 0.6, 0.8, 25, 160, 250),
    row('RER', 0.6, 0.8, 25, 160, 250),
    { match: {}, powerRatio: 0.5, reading: 'parallel', voltageRatio: 0.8 },
  ],
};

/**
 * MIL-STD-975M (1994, cancelled 1998), Appendix A 3.11: power ratio 0.60 (RLR 0.30) up to the first temperature, zero at
 * the second. The table states no voltage ratio in the copy at hand, so the limiting element voltage stands as it is.
 */
export const milStd975: AgencyPolicy = {
  name: 'MIL-STD-975M',
  source: 'MIL-STD-975M (1994, cancelled 1998), Appendix A 3.11; voltage ratio not stated there, 1 is used',
  entries: [
    row('RCR', 0.6, 1, 70, 110),
    row('RNC', 0.6, 1, 125, 155),
    row('RBR', 0.6, 1, 125, 137),
    row('RWR', 0.6, 1, 30, 175),
    row('RER', 0.6, 1, 30, 175),
    row('RZO', 0.6, 1, 70, 125),
    row('RM', 0.6, 1, 70, 118),
    row('RLR', 0.3, 1, 70, 94),
  ],
};

/**
 * RL-TR-92-11 (1992), Table 9-2, chip RM: power at most 50 %, voltage at most 75 %. Its temperature line (at most 80 % of
 * rated) is a fraction of each part's own limit and has no field here; the source says so.
 */
export const rlTr9211: AgencyPolicy = {
  name: 'RL-TR-92-11',
  source:
    'RL-TR-92-11 (1992), Table 9-2, chip RM; its limit of 80 % of the rated temperature is to be held beside this entry',
  entries: [{ match: { style: 'RM' }, powerRatio: 0.5, reading: 'multiplied', voltageRatio: 0.75 }],
};

export const agencyPolicies: readonly AgencyPolicy[] = [nasaEeeInst002, milStd975, rlTr9211];
