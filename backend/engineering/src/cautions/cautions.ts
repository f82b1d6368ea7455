import type { Conditions } from '../operating/conditions';
import type { OperatingState } from '../operating/settle';

/** A caution that the numbers call for: a stable kind, a short heading, words with the figures. */
export interface Caution {
  kind: string;
  title: string;
  text: string;
}

/** Element temperature from which a body is called hot to touch, °C; common practice, the standard in force decides. */
const hotSurface = 70;
/** Extra-low voltage, V: 60 V d.c. and 42.4 V peak a.c. (IEC 60950-1, withdrawn); the load does not say which it is. */
const extraLowVoltageDirect = 60;
const extraLowVoltagePeak = 42.4;
/** Altitude from which thinner air matters to cooling and clearance, m; common practice. */
const thinAir = 2000;
/** Dissipation from which a part under overload can set its surroundings alight, W; common practice. */
const ignitionWatt = 1;

type CautionRule = (conditions: Conditions, state: OperatingState) => Caution | undefined;

const rules: readonly CautionRule[] = [
  function hot(_conditions, { hot, settled }) {
    if (!settled || !(hot >= hotSurface)) return undefined;
    return {
      kind: 'hot-surface',
      title: 'Hot surface.',
      text: `About ${hot.toFixed(0)} °C at the element at the highest load: keep clear of hands and of parts that mind heat. Touch limits depend on material and time (IEC 62368-1, Table 38).`,
    };
  },
  function voltage({ requirement, load }, state) {
    const steady = load === undefined ? 0 : state.settled ? state.voltage : load.voltageMax;
    const pulse = Math.max(0, ...(requirement.duty.pulses ?? []).map((part) => Math.abs(part.voltage ?? 0)));
    const volt = Math.max(steady, pulse);
    if (!(volt * Math.SQRT2 > extraLowVoltagePeak)) return undefined;
    const figure = Number.isFinite(volt) ? `${volt.toPrecision(3)} V` : 'A voltage that nothing bounds';
    return {
      kind: 'hazardous-voltage',
      title: 'Hazardous voltage.',
      text: `${figure} across the part; above ${String(extraLowVoltageDirect)} V d.c. or ${String(extraLowVoltagePeak)} V peak a.c. it can be dangerous to touch. Spacing and protection follow the standard in force.`,
    };
  },
  function charge({ requirement }) {
    const charged = (requirement.duty.pulses ?? []).filter((pulse) => pulse.shape === 'capacitor-discharge');
    if (charged.length === 0) return undefined;
    return {
      kind: 'stored-charge',
      title: 'Stored charge.',
      text: 'The part discharges a capacitor: if it fails open the charge stays. At a mains plug 60 V must be reached within 2 s (IEC 62368-1).',
    };
  },
  function safety({ requirement, ratings }) {
    const { mains, function: safetyFunction } = requirement.duty.safety ?? {};
    if (mains !== true && safetyFunction !== true) return undefined;
    const has = (ratings.certificates?.length ?? 0) > 0;
    return {
      kind: 'certified-type',
      title: 'Certified type needed.',
      text: `A position ${mains === true ? 'connected to the mains' : 'with a safety function'} needs a type certified to the standard in force${has ? '; confirm that the certificate covers this use' : ', and this part shows no certificate'}. Consider what happens when it fails open or short.`,
    };
  },
  function flammability({ ratings, allowedDissipation }, state) {
    const flameproof =
      ratings.features?.some((feature) => feature === 'flameproof' || feature === 'fusible') ?? false;
    const loaded = state.settled ? state.dissipation : Infinity;
    const watt = Math.max(loaded, allowedDissipation.known ? allowedDissipation.value : 0);
    if (flameproof || watt < ignitionWatt || ratings.resistance === 0) return undefined;
    const figure = Number.isFinite(watt) ? `at ${watt.toPrecision(3)} W` : 'beyond any operating point';
    return {
      kind: 'flammability',
      title: 'Overload can ignite.',
      text: `The part is rated or loaded ${figure} and claims neither a flameproof coating nor a fusible element: consider what an overload does to it and to the board beneath.`,
    };
  },
  function surge({ requirement }) {
    if (!(requirement.duty.pulses ?? []).some((pulse) => pulse.shape.startsWith('surge'))) return undefined;
    return {
      kind: 'surge',
      title: 'Surge.',
      text: 'A surge stresses the whole path: confirm by test with the generator and coupling of IEC 61000-4-5.',
    };
  },
  function altitude({ requirement }) {
    const metre = requirement.duty.ambient?.altitude ?? 0;
    if (metre < thinAir) return undefined;
    return {
      kind: 'altitude',
      title: 'Thin air.',
      text: `At ${String(metre)} m air cools less and breaks down earlier: clearances grow with altitude, and the allowed dissipation falls.`,
    };
  },
  function corrosion({ requirement, ratings }) {
    const asked = requirement.duty.features?.includes('sulphur-resistant') ?? false;
    if (!asked) return undefined;
    const resists = ratings.features?.includes('sulphur-resistant') ?? false;
    return {
      kind: 'corrosive-atmosphere',
      title: 'Corrosive atmosphere.',
      text: resists
        ? 'The family claims resistance to sulphur; its test and duration are in the datasheet. Other gases and salt are another matter.'
        : 'The family claims no resistance to sulphur: silver terminations can open in months.',
    };
  },
  function discharge({ ratings }) {
    const length = ratings.body?.length;
    if (
      ratings.technology !== 'thin-film' ||
      ratings.mounting !== 'surface' ||
      length === undefined ||
      length > 0.0017
    )
      return undefined;
    return {
      kind: 'electrostatic-discharge',
      title: 'Sensitive to discharge.',
      text: 'Small thin-film chips can shift by an electrostatic discharge: handle them accordingly.',
    };
  },
];

/** The cautions that the numbers of an assessment call for, in a fixed order. */
export function cautionsOf(conditions: Conditions, state: OperatingState): Caution[] {
  return rules.map((rule) => rule(conditions, state)).filter((caution) => caution !== undefined);
}

/** What stands on every result and report. */
export const generalCaution =
  'A calculation for selection, to be confirmed against the manufacturer’s datasheet and the standards and local codes in ' +
  'force by a qualified, where required a licensed, engineer. It certifies nothing.';
