import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { SeedDataError } from './seed-data-error';

/**
 * @param directory the seed data's folder
 * @param file path inside it, as refusals name it
 * @throws SeedDataError where the file is missing or is not JSON
 */
export function readJson(directory: string, file: string): unknown {
  let text: string;
  try {
    text = readFileSync(join(directory, file), 'utf8');
  } catch (error) {
    throw new SeedDataError(
      file,
      '',
      `cannot be read: ${error instanceof Error ? error.message : 'unknown'}`,
    );
  }
  try {
    return JSON.parse(text) as unknown;
  } catch (error) {
    throw new SeedDataError(file, '', `is not JSON: ${error instanceof Error ? error.message : 'unknown'}`);
  }
}
