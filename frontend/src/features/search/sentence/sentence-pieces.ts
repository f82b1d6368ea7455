import { approvalWords, supplyWords } from '../../../wording/standing-words';
import { featureWords, mountingWords } from '../../../wording/technology-words';
import type { EntryName } from '../duty/duty-entry';
import type { DutyText } from '../duty/duty-text';
import { entryWords, reachesFromZero } from '../duty/entry-words';
import { type PanelPlace, panelPlaces } from '../panel/panel-places';

/** Words of the sentence: plain, an entry to be edited in place, or a choice that the panel holds. */
export type Piece =
  | { kind: 'words'; words: string }
  | { kind: 'entry'; name: EntryName; words: string }
  | { kind: 'choice'; place: PanelPlace; words: string }
  | { kind: 'policy'; words: string };

type Draft = (string | Piece)[];

const either = (words: string[]): string => {
  if (words.length < 2) return words[0] ?? 'none';
  return `${words.slice(0, -1).join(', ')} or ${words[words.length - 1] ?? ''}`;
};

/** Builds the clauses of the sentence out of what is stated; nothing that is not stated is mentioned. */
class Clauses {
  constructor(private readonly duty: DutyText) {}

  private stated(name: EntryName): string | undefined {
    const text = this.duty.entries[name]?.trim();
    return text ? text : undefined;
  }

  private entry(name: EntryName): Piece | undefined {
    const text = this.stated(name);
    return text === undefined ? undefined : { kind: 'entry', name, words: entryWords(name, text) };
  }

  private clause(before: string, name: EntryName, after = ''): Draft[] {
    const piece = this.entry(name);
    return piece === undefined ? [] : [[before, piece, after]];
  }

  opening(): Draft {
    const lower = this.entry('lower');
    const upper = this.entry('upper');
    const nominal = this.entry('nominal');
    const life = this.entry('life');
    const lasting: Draft = life === undefined ? [] : [' for ', life];
    if (lower?.words === '0 Ω' && upper !== undefined)
      return ['A zero-ohm link of at most ', upper, ...lasting];
    if (lower !== undefined && upper !== undefined) {
      const named: Draft = nominal === undefined ? [] : [', nominally ', nominal, ','];
      return ['A resistor that stays between ', lower, ' and ', upper, ...named, ...lasting];
    }
    const limitVoltage = this.entry('limitVoltage');
    const limitCurrent = this.entry('limitCurrent');
    if (limitVoltage !== undefined && limitCurrent !== undefined) {
      return ['A resistor that carries ', limitCurrent, ' with ', limitVoltage, ' across it', ...lasting];
    }
    if (nominal !== undefined) return ['A resistor of ', nominal, ...lasting];
    return ['Any resistor', ...lasting];
  }

  load(): Draft[] {
    const reach = (name: EntryName): string =>
      reachesFromZero(name, this.stated(name) ?? '') ? 'up to ' : '';
    return [
      ...this.clause(`with ${reach('voltage')}`, 'voltage', ' across it'),
      ...this.clause(`carrying ${reach('current')}`, 'current'),
      ...this.clause('dissipating up to ', 'power'),
    ];
  }

  surroundings(): Draft[] {
    return [
      ...this.clause('at ', 'ambient'),
      ...this.clause('', 'rise', ' warmer in its enclosure'),
      ...this.clause('with its terminals at ', 'terminal'),
      ...this.clause('with its case at ', 'case'),
      ...this.clause('up to ', 'altitude', ' high'),
    ];
  }

  special(): Draft[] {
    const { pulses, mounting, features, mains, safetyFunction, secondSource } = this.duty;
    const clauses: Draft[] = [
      ...this.clause('insulated for ', 'insulation'),
      ...this.clause('with at most ', 'noiseLimit', ' of noise'),
      ...this.clause('true to its value at ', 'frequency'),
      ...this.clause('no longer than ', 'length'),
      ...this.clause('no wider than ', 'width'),
      ...this.clause('no higher than ', 'height'),
    ];
    const choice = (place: PanelPlace, words: string): void => {
      clauses.push([{ kind: 'choice', place, words }]);
    };
    if (pulses.length > 0)
      choice(panelPlaces.pulses, pulses.length === 1 ? 'under a pulse' : `under ${pulses.length} pulses`);
    if (mounting !== undefined)
      choice(panelPlaces.mounting, `mounted: ${mountingWords[mounting].toLowerCase()}`);
    if (features.length > 0) {
      choice(
        panelPlaces.features,
        features.map((feature) => featureWords[feature].toLowerCase()).join(' and '),
      );
    }
    if (mains) choice(panelPlaces.safety, 'connected to the mains');
    if (safetyFunction) choice(panelPlaces.safety, 'with a safety function');
    if (secondSource) choice(panelPlaces.secondSource, 'with a second source');
    return clauses;
  }

  terms(policyName: string): Draft {
    const { approvals, supply, deviation, policy } = this.duty;
    const rule: Draft =
      deviation === 'worst-case'
        ? []
        : [
            ', deviations added ',
            { kind: 'choice', place: panelPlaces.deviation, words: 'as root sum of squares' },
          ];
    return [
      policy === 'none' ? ', by ' : ', derated by ',
      { kind: 'policy', words: policyName },
      ...rule,
      '; ',
      {
        kind: 'choice',
        place: panelPlaces.approval,
        words: either(approvals.map((approval) => approvalWords[approval].toLowerCase())),
      },
      ', supply ',
      {
        kind: 'choice',
        place: panelPlaces.supply,
        words: either(supply.map((status) => supplyWords[status].toLowerCase())),
      },
      '.',
    ];
  }
}

/** The duty as one sentence, defaults included: what is asked is always said. */
export function sentencePieces(duty: DutyText, policyName: string): Piece[] {
  const clauses = new Clauses(duty);
  const listed = [...clauses.load(), ...clauses.surroundings(), ...clauses.special()].flatMap(
    (clause): Draft => [', ', ...clause],
  );
  return [...clauses.opening(), ...listed, ...clauses.terms(policyName)]
    .map((part): Piece => (typeof part === 'string' ? { kind: 'words', words: part } : part))
    .filter((piece) => piece.words !== '');
}
