import { createHash } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { readdir, readFile, stat, writeFile } from 'node:fs/promises';
import { join, relative, sep } from 'node:path';
import { pipeline } from 'node:stream/promises';

export const MANIFEST_FILE = 'manifest.json';

export interface ManifestFile {
  /** Relative to the backup, with forward slashes */
  path: string;
  bytes: number;
  /** SHA-256, hexadecimal */
  sha256: string;
}

/** What a backup consists of, so that damage and loss can be seen. */
export interface BackupManifest {
  name: string;
  /** ISO 8601 */
  createdAt: string;
  reason: 'nightly' | 'on-demand';
  /** Name of the newest migration */
  schema: string;
  files: ManifestFile[];
}

/** Lists and hashes every file under a folder. */
export async function hashFiles(folder: string): Promise<ManifestFile[]> {
  const entries = await readdir(folder, { recursive: true, withFileTypes: true });
  const paths = entries
    .filter((entry) => entry.isFile())
    .map((entry) => relative(folder, join(entry.parentPath, entry.name)).split(sep).join('/'))
    .filter((path) => path !== MANIFEST_FILE)
    .sort();
  const files: ManifestFile[] = [];
  // One after the other: a backup is in no hurry and must not crowd the requests out.
  for (const path of paths) files.push(await describeFile(folder, path));
  return files;
}

async function describeFile(folder: string, path: string): Promise<ManifestFile> {
  const file = join(folder, path);
  const hash = createHash('sha256');
  await pipeline(createReadStream(file), hash);
  return { path, bytes: (await stat(file)).size, sha256: hash.digest('hex') };
}

export async function writeManifest(folder: string, manifest: BackupManifest): Promise<void> {
  await writeFile(join(folder, MANIFEST_FILE), `${JSON.stringify(manifest, null, 2)}\n`, {
    mode: 0o600,
    flush: true,
  });
}

/** @throws Error when there is no manifest or it is not one */
export async function readManifest(folder: string): Promise<BackupManifest> {
  const manifest: unknown = JSON.parse(await readFile(join(folder, MANIFEST_FILE), 'utf8'));
  if (!isManifest(manifest)) throw new Error('The manifest of the backup is damaged.');
  return manifest;
}

function isManifest(value: unknown): value is BackupManifest {
  return (
    typeof value === 'object' &&
    value !== null &&
    'name' in value &&
    'createdAt' in value &&
    'schema' in value &&
    'files' in value &&
    Array.isArray(value.files)
  );
}
