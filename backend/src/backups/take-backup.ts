import { existsSync } from 'node:fs';
import { cp, mkdir, open, rename, rm } from 'node:fs/promises';
import { join } from 'node:path';
import type { Environment } from '../config/environment';
import { type BackupManifest, hashFiles, writeManifest } from './backup-manifest';
import { DATABASE_FILE } from './check-backup';
import { SqliteFile } from './sqlite-file';

/** Ends the name of a backup's folder until it is whole. */
export const UNFINISHED = '.partial';

/**
 * Writes one backup: the database as of one moment, however much is being written, then the uploads, which only ever
 * grow, so that whatever the database speaks of is among them. It appears under its name only when it is whole.
 */
export async function takeBackup(
  environment: Environment,
  description: Pick<BackupManifest, 'name' | 'createdAt' | 'reason'>,
): Promise<BackupManifest> {
  const folder = join(environment.folder('backups'), description.name);
  const draft = folder + UNFINISHED;
  await mkdir(draft, { recursive: true, mode: 0o700 });
  try {
    const copy = join(draft, DATABASE_FILE);
    const schema = await copyDatabase(environment.databaseFile, copy);
    const uploads = environment.folder('uploads');
    if (existsSync(uploads))
      await cp(uploads, join(draft, 'uploads'), { recursive: true, preserveTimestamps: true });
    const manifest: BackupManifest = { ...description, schema, files: await hashFiles(draft) };
    for (const { path } of manifest.files) await flush(join(draft, path));
    await writeManifest(draft, manifest);
    await rename(draft, folder);
    await flush(environment.folder('backups'));
    return manifest;
  } catch (error) {
    await rm(draft, { recursive: true, force: true });
    throw error;
  }
}

/** @returns the name of the newest migration in the copy */
async function copyDatabase(source: string, copy: string): Promise<string> {
  const database = await SqliteFile.open(source, 'write');
  try {
    await database.run('VACUUM INTO $copy', { $copy: copy });
  } finally {
    await database.close();
  }
  const copied = await SqliteFile.open(copy);
  try {
    const [newest] = await copied.select<{ name: string }>('SELECT max(name) AS name FROM schema_migrations');
    return newest?.name ?? '';
  } finally {
    await copied.close();
  }
}

/** Waits until a file or folder is on the disk, not only in the cache. */
async function flush(path: string): Promise<void> {
  const handle = await open(path, 'r');
  try {
    await handle.sync();
  } finally {
    await handle.close();
  }
}
