import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { checksumOf, type Migration } from '../database/migration';
import { hashFiles, type ManifestFile, readManifest } from './backup-manifest';
import { SqliteFile } from './sqlite-file';

export const DATABASE_FILE = 'database.sqlite';

/**
 * Holds a backup against its manifest and asks SQLite whether it is whole.
 *
 * @param migrations those that this version knows
 * @returns what is wrong with it, in words; empty when it can be restored
 */
export async function backupFaults(folder: string, migrations: readonly Migration[]): Promise<string[]> {
  if (!(await readdir(folder)).includes(DATABASE_FILE)) return ['the database is missing'];
  try {
    const manifest = await readManifest(folder);
    const changed = fileFaults(manifest.files, await hashFiles(folder));
    return changed.length > 0 ? changed : await databaseFaults(join(folder, DATABASE_FILE), migrations);
  } catch (error) {
    return [error instanceof Error ? error.message : String(error)];
  }
}

function fileFaults(expected: readonly ManifestFile[], found: readonly ManifestFile[]): string[] {
  const foundByPath = new Map(found.map((file) => [file.path, file]));
  const missing = expected
    .filter(({ path }) => !foundByPath.has(path))
    .map(({ path }) => `${path} is missing`);
  const changed = expected
    .filter(({ path, sha256 }) => foundByPath.has(path) && foundByPath.get(path)?.sha256 !== sha256)
    .map(({ path }) => `${path} is not what was backed up`);
  const known = new Set(expected.map(({ path }) => path));
  const added = found
    .filter(({ path }) => !known.has(path))
    .map(({ path }) => `${path} does not belong to it`);
  return [...missing, ...changed, ...added];
}

async function databaseFaults(file: string, migrations: readonly Migration[]): Promise<string[]> {
  const database = await SqliteFile.open(file);
  try {
    const integrity = await database.select<{ integrity_check: string }>('PRAGMA integrity_check');
    const orphans = await database.select('PRAGMA foreign_key_check');
    const history = await database.select<{ name: string; checksum: string }>(
      'SELECT name, checksum FROM schema_migrations ORDER BY name',
    );
    const unknown = history.filter(({ name, checksum }, index) => {
      const known = migrations[index];
      return known?.name !== name || checksumOf(known) !== checksum;
    });
    return [
      ...integrity.filter((row) => row.integrity_check !== 'ok').map((row) => row.integrity_check),
      ...(orphans.length > 0 ? [`${orphans.length} rows refer to nothing`] : []),
      ...unknown.map(({ name }) => `this version does not know its schema "${name}"`),
    ];
  } finally {
    await database.close();
  }
}
