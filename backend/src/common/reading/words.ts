/** The words of a text, parted by blanks, as JSON text to bind. */
export function wordsOf(text: string): string {
  return JSON.stringify(text.split(/\s+/).filter((word) => word !== ''));
}

/**
 * A condition in SQL: the expression contains every one of the words, wherever, small and capital letters alike. Every
 * character means itself.
 *
 * @param bound name of the bound value that `wordsOf` made, such as `$words`
 */
export function containsWords(expression: string, bound: string): string {
  return `NOT EXISTS (SELECT 1 FROM json_each(${bound}) AS word WHERE instr(lower(${expression}), lower(word.value)) = 0)`;
}
