import { existsSync } from 'node:fs';
import { readdir, rm } from 'node:fs/promises';
import { join } from 'node:path';
import { Injectable } from '@nestjs/common';
import type { Actor } from '../audit/actor';
import { AuditTrail } from '../audit/audit-trail';
import { Clock } from '../common/clock';
import { ConflictProblem, NotFoundProblem } from '../common/problems/problems';
import { Environment } from '../config/environment';
import { migrations } from '../database/migrations';
import { Writer } from '../database/writer';
import { type BackupManifest, readManifest } from './backup-manifest';
import { backupName, isBackupName } from './backup-name';
import { backupFaults } from './check-backup';
import { takeBackup, UNFINISHED } from './take-backup';

/** Nightly backups that are kept; those on demand stay until somebody removes their folder. */
const NIGHTLY_KEPT = 14;

export interface ListedBackup {
  name: string;
  manifest: BackupManifest | undefined;
}

/** Taking, listing and checking backups. Restoring is a command, since the server must not be running. */
@Injectable()
export class BackupsService {
  private taking = false;

  constructor(
    private readonly environment: Environment,
    private readonly writer: Writer,
    private readonly audit: AuditTrail,
    private readonly clock: Clock,
  ) {}

  /** @throws ConflictProblem when one is being taken already */
  async take(actor: Actor, reason: BackupManifest['reason']): Promise<BackupManifest> {
    if (this.taking) throw new ConflictProblem('A backup is being taken already; wait until it is done.');
    this.taking = true;
    try {
      await this.removeUnfinished();
      const now = this.clock.now();
      const description = { name: backupName(now), createdAt: now.toISOString(), reason };
      const manifest = await takeBackup(this.environment, description);
      await this.note(actor, 'create', manifest.name, { bytes: bytesOf(manifest), reason });
      return manifest;
    } finally {
      this.taking = false;
    }
  }

  /** The newest first; one whose manifest cannot be read comes without it. */
  async list(): Promise<ListedBackup[]> {
    const folder = this.environment.folder('backups');
    const names = (await this.folders()).filter(isBackupName).sort().reverse();
    return Promise.all(
      names.map(async (name) => ({
        name,
        manifest: await readManifest(join(folder, name)).catch(() => undefined),
      })),
    );
  }

  /**
   * @returns what is wrong with a backup; empty when it can be restored
   * @throws NotFoundProblem
   */
  async check(actor: Actor, name: string): Promise<string[]> {
    const folder = join(this.environment.folder('backups'), name);
    if (!isBackupName(name) || !existsSync(folder)) throw new NotFoundProblem('There is no such backup.');
    const faults = await backupFaults(folder, migrations);
    await this.note(actor, 'check', name, { faults });
    return faults;
  }

  /** Removes nightly backups beyond the newest ones. */
  async removeOld(actor: Actor): Promise<void> {
    const nightly = (await this.list()).filter(({ manifest }) => manifest?.reason === 'nightly');
    for (const { name } of nightly.slice(NIGHTLY_KEPT)) {
      await rm(join(this.environment.folder('backups'), name), { recursive: true });
      await this.note(actor, 'remove', name, { kept: NIGHTLY_KEPT });
    }
  }

  /** What a kill in the middle of a backup has left. */
  private async removeUnfinished(): Promise<void> {
    const unfinished = (await this.folders()).filter((name) => name.endsWith(UNFINISHED));
    for (const name of unfinished)
      await rm(join(this.environment.folder('backups'), name), { recursive: true });
  }

  private async folders(): Promise<string[]> {
    const folder = this.environment.folder('backups');
    return existsSync(folder) ? readdir(folder) : [];
  }

  private async note(actor: Actor, action: string, name: string, after: object): Promise<void> {
    await this.writer.transaction((transaction) =>
      this.audit.record(transaction, { actor, action, subjectType: 'Backup', subjectId: name, after }),
    );
  }
}

export function bytesOf(manifest: BackupManifest): number {
  return manifest.files.reduce((sum, file) => sum + file.bytes, 0);
}
