import { Fragment } from 'react';

/** The index of a symbol: R_low, P_rated. */
const indexed = /(?<=[\p{L}Δ])_([\p{L}\d,+−-]+)/gu;

/** A formula as it is printed: what follows an underscore stands as an index. */
export function Formula({ text }: { text: string }) {
  return text
    .split(indexed)
    .map((piece, at) => (at % 2 === 1 ? <sub key={at}>{piece}</sub> : <Fragment key={at}>{piece}</Fragment>));
}
