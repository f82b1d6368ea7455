/** A unit that may be typed. SI value = figure × 10^exponent × factor + offset. */
export interface UnitDefinition {
  readonly spellings: readonly string[];
  readonly exponent: number;
  /** Exact factor that is no power of ten: 3600 for the hour. */
  readonly factor?: number;
  /** Added after scaling: −273.15 brings kelvin to °C. */
  readonly offset?: number;
  /** Whether SI prefixes may stand before it. */
  readonly prefixes?: boolean;
}

/** How a value is printed. */
export type PrintedForm =
  | { readonly kind: 'prefixed'; readonly unit: string; readonly lowest: number; readonly highest: number }
  | { readonly kind: 'fixed'; readonly unit: string; readonly exponent: number; readonly sign?: '±' }
  | { readonly kind: 'time' }
  | { readonly kind: 'length' };

/** What notation knows about one quantity. */
export interface QuantityDefinition {
  /** With its article, for messages: "a resistance". */
  readonly name: string;
  readonly example: string;
  readonly units: readonly UnitDefinition[];
  /** Powers of ten that a number without a unit may stand for; more than one means that the limits must decide. */
  readonly bareExponents: readonly number[];
  /** Whether a prefix may stand for prefix and unit (4.7k). */
  readonly prefixAlone?: boolean;
  /** Whether a K alone is taken for kilo. */
  readonly capitalKiloAlone?: boolean;
  /** Letters beside the prefixes that may stand for the decimal point (4R7, 3V3), with their power of ten; absent: none, prefixes neither. */
  readonly pointLetters?: ReadonlyMap<string, number>;
  /** Whether ± may stand before the figure. */
  readonly plusMinus?: boolean;
  /** Whether 1/4 may be typed for 0.25. */
  readonly quotients?: boolean;
  /** Lowest and highest value accepted, SI. */
  readonly lowest: number;
  readonly highest: number;
  /** Smallest magnitude accepted beside 0; a smaller one is a slip of the prefix. */
  readonly smallest: number;
  readonly zeroRefused?: boolean;
  readonly printed: PrintedForm;
}
