const longest = 40;

/** The input as messages name it: in quotation marks, cut after 40 characters. */
export function quoteInput(text: string): string {
  const characters = Array.from(text.trim());
  const shown =
    characters.length > longest ? `${characters.slice(0, longest).join('')}…` : characters.join('');
  return `“${shown}”`;
}
