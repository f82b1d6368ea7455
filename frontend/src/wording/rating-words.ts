/** Ratings as the interface names them, by their field. */
const words: Record<string, string> = {
  resistance: 'Resistance',
  tolerance: 'Tolerance',
  tcr: 'TCR',
  referenceTemperature: 'TCR refers to',
  ratedDissipation: 'Rated dissipation',
  derating: 'Derating',
  limitingElementVoltage: 'Limiting element voltage',
  overloadVoltage: 'Overload voltage',
  insulationVoltage: 'Insulation voltage',
  category: 'Category temperatures',
  'category.min': 'Lower category temperature',
  'category.max': 'Upper category temperature',
  maxElementTemperature: 'Largest element temperature',
  thermalResistance: 'Thermal resistance',
  voltageCoefficient: 'Voltage coefficient',
  noiseIndex: 'Noise index',
  inductance: 'Inductance',
  capacitance: 'Capacitance',
  pulses: 'Pulses',
  'pulses.single': 'Single pulses',
  'pulses.continuous': 'Repeated pulses',
  'pulses.voltage': 'Pulse voltage',
  'pulses.energy': 'Pulse energy',
  'pulses.shift': 'Shift by pulses',
  failureRateStyle: 'Style in the failure-rate handbook',
  drift: 'Drift in the load-life test',
  solderShift: 'Shift by soldering',
  humidityShift: 'Shift by humidity',
  body: 'Body, length × width × height',
  'body.length': 'Body length',
  'body.width': 'Body width',
  'body.height': 'Body height',
  bodyStyle: 'Body',
  size: 'Size',
  mounting: 'Mounting',
  features: 'Features',
  certificates: 'Certificates',
  technology: 'Technology',
  termination: 'Termination',
  landPattern: 'Land pattern',
  soldering: 'Soldering',
  link: 'Link',
  'link.ratedCurrent': 'Rated current of the link',
  'link.residualResistance': 'Largest residual resistance',
};

/** A field that has no words of its own is shown by its name rather than left out. */
export const ratingWords = (field: string): string => words[field] ?? field;

/** As it stands within a sentence; what is written in capitals stays so. */
export function ratingWordsInLine(field: string): string {
  const name = ratingWords(field);
  return /^[A-Z][A-Z]/.test(name) ? name : name.charAt(0).toLowerCase() + name.slice(1);
}
