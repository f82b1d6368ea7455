/** The colours of bands, by their names in IEC 60062. */
export const colours = [
  'pink',
  'silver',
  'gold',
  'black',
  'brown',
  'red',
  'orange',
  'yellow',
  'green',
  'blue',
  'violet',
  'grey',
  'white',
] as const;

export type Colour = (typeof colours)[number];
