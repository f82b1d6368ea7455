/** A stretch of a letter: words, or an address to follow. */
export interface LetterPiece {
  text: string;
  isLink: boolean;
}

/** Only web addresses are followed; anything else in a letter stays words. */
const followed = (link: string): boolean => /^https?:\/\//.test(link);

/** Splits a letter at the addresses that the server found in it. */
export function letterPieces(text: string, links: readonly string[]): LetterPiece[] {
  const known = [...new Set(links.filter(followed))];
  const pieces: LetterPiece[] = [];
  let rest = text;
  while (rest !== '') {
    const next = known
      .map((link) => ({ link, at: rest.indexOf(link) }))
      .filter(({ at }) => at >= 0)
      // The longer of two that begin together: one may be the beginning of the other.
      .sort((first, second) => first.at - second.at || second.link.length - first.link.length)[0];
    if (next === undefined) {
      pieces.push({ text: rest, isLink: false });
      break;
    }
    if (next.at > 0) pieces.push({ text: rest.slice(0, next.at), isLink: false });
    pieces.push({ text: next.link, isLink: true });
    rest = rest.slice(next.at + next.link.length);
  }
  return pieces;
}
