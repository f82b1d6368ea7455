import { existsSync } from 'node:fs';
import { cp, mkdir, rename, rm } from 'node:fs/promises';
import { join } from 'node:path';
import type { Environment } from '../config/environment';
import { DataDirectoryLock } from '../database/data-directory-lock';
import { restoreFolder } from '../database/interrupted-restore';
import { migrations } from '../database/migrations';
import { isBackupName } from './backup-name';
import { backupFaults, DATABASE_FILE } from './check-backup';
import { SqliteFile } from './sqlite-file';

/** Thrown with words for whoever gave the command. */
export class RestoreRefused extends Error {
  override readonly name = 'RestoreRefused';
}

/**
 * Puts a backup in the place of the present data, which is set aside, not deleted. Everybody signs in anew, since
 * sessions that were ended after the backup would be open again in it.
 *
 * @returns the folder in which the replaced data now lies, or undefined when there was none
 * @throws RestoreRefused when there is no such backup, it is not whole, or the server is running
 */
export async function restoreBackup(
  environment: Environment,
  name: string,
  now: Date,
): Promise<string | undefined> {
  const backup = join(environment.folder('backups'), name);
  if (!isBackupName(name) || !existsSync(backup)) {
    throw new RestoreRefused(`There is no backup "${name}" in ${environment.folder('backups')}.`);
  }
  const lock = await DataDirectoryLock.take(environment.dataDirectory).catch((error: unknown) => {
    throw new RestoreRefused(error instanceof Error ? error.message : String(error));
  });
  try {
    const faults = await backupFaults(backup, migrations);
    if (faults.length > 0) throw new RestoreRefused(`The backup cannot be restored: ${faults.join('; ')}.`);
    return await replaceData(environment, backup, name, now);
  } finally {
    await lock.release();
  }
}

/** Prepares everything beside the present data first, so that what can fail fails before anything is moved. */
async function replaceData(
  environment: Environment,
  backup: string,
  name: string,
  now: Date,
): Promise<string | undefined> {
  const draft = restoreFolder(environment);
  await rm(draft, { recursive: true, force: true });
  await cp(backup, draft, { recursive: true, preserveTimestamps: true });
  await prepareDatabase(join(draft, DATABASE_FILE), name, now);
  const aside = await setAside(environment, now);
  await rename(join(draft, DATABASE_FILE), environment.databaseFile);
  if (existsSync(join(draft, 'uploads'))) await rename(join(draft, 'uploads'), environment.folder('uploads'));
  await rm(draft, { recursive: true });
  return aside;
}

async function prepareDatabase(file: string, name: string, now: Date): Promise<void> {
  const database = await SqliteFile.open(file, 'write');
  try {
    await database.run('BEGIN IMMEDIATE');
    await database.run(
      `UPDATE sessions SET ended_at = $now, ended_reason = 'restored' WHERE ended_at IS NULL`,
      {
        $now: now.toISOString(),
      },
    );
    await database.run(
      `INSERT INTO audit_entries (recorded_at, actor_name, action, subject_type, subject_id, reason)
        VALUES ($now, 'Resistry', 'restore', 'Backup', $name, 'by the restore command')`,
      { $now: now.toISOString(), $name: name },
    );
    await database.run('COMMIT');
  } finally {
    await database.close();
  }
}

async function setAside(environment: Environment, now: Date): Promise<string | undefined> {
  const present = [
    environment.databaseFile,
    // The write-ahead log belongs to its database: left behind, it would be played into the restored one.
    `${environment.databaseFile}-wal`,
    `${environment.databaseFile}-shm`,
    environment.folder('uploads'),
  ].filter((path) => existsSync(path));
  if (present.length === 0) return undefined;
  const aside = join(
    environment.dataDirectory,
    `replaced-${now.toISOString().slice(0, 19).replaceAll(':', '-')}Z`,
  );
  await mkdir(aside, { mode: 0o700 });
  for (const path of present)
    await rename(path, join(aside, path.slice(environment.dataDirectory.length + 1)));
  return aside;
}
