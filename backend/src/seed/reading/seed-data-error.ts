/** Thrown where a file of the seed data cannot be used; names the file and the field. */
export class SeedDataError extends Error {
  override readonly name = 'SeedDataError';

  constructor(
    readonly file: string,
    readonly field: string,
    words: string,
  ) {
    super(`${file}, ${field === '' ? 'the whole file' : field}: ${words}`);
  }
}
