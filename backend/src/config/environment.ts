import { join, resolve } from 'node:path';
import { ConfigurationError } from './configuration-error';

export const SEEDS = ['none', 'demo'] as const;
export type Seed = (typeof SEEDS)[number];

/** The repository's root, the same from `src` and from `dist`. */
export const REPOSITORY_ROOT = resolve(__dirname, '../../..');

interface EnvironmentValues {
  port: number;
  host: string;
  dataDirectory: string;
  seed: Seed;
  mailUrl: string | undefined;
  appUrl: string | undefined;
}

/** Everything that the application takes from outside, validated once at start. */
export class Environment {
  /** TCP port; 0 takes any free one. */
  readonly port: number;
  readonly host: string;
  /** Absolute path of the folder that holds database, uploads, secrets, mail and backups. */
  readonly dataDirectory: string;
  readonly seed: Seed;
  /** SMTP address; absent, the local catcher keeps the mail. */
  readonly mailUrl: string | undefined;
  /** Origin under which people reach the application, when it was given. */
  readonly givenAppUrl: string | undefined;

  constructor(values: EnvironmentValues) {
    this.port = values.port;
    this.host = values.host;
    this.dataDirectory = values.dataDirectory;
    this.seed = values.seed;
    this.mailUrl = values.mailUrl;
    this.givenAppUrl = values.appUrl;
  }

  get databaseFile(): string {
    return join(this.dataDirectory, 'resistry.sqlite');
  }

  /** Folder of a kind of kept files: `uploads`, `mail`, `secrets`, `backups`. */
  folder(name: 'uploads' | 'mail' | 'secrets' | 'backups'): string {
    return join(this.dataDirectory, name);
  }

  /** Origin used in links that leave by mail. */
  get appUrl(): string {
    return this.givenAppUrl ?? `http://localhost:${this.port}`;
  }

  /** True where a proxy in front of the application speaks TLS to the browser. */
  get servedOverTls(): boolean {
    return this.givenAppUrl?.startsWith('https://') ?? false;
  }
}

type Variables = Readonly<Record<string, string | undefined>>;

/**
 * Reads and validates the environment. An empty variable counts as unset.
 *
 * @param variables usually `process.env`
 * @param base folder that a relative DATA_DIR is relative to
 * @throws ConfigurationError naming every variable that cannot be used
 */
export function readEnvironment(variables: Variables, base: string = process.cwd()): Environment {
  const faults: string[] = [];
  const given = (name: string): string | undefined => variables[name]?.trim() || undefined;

  const port = readPort(given('PORT'), faults);
  const seed = readSeed(given('SEED'), faults);
  const mailUrl = readMailUrl(given('MAIL_URL'), faults);
  const appUrl = readAppUrl(given('APP_URL'), faults);
  // The demonstration's passwords are public: it stays on this machine unless somebody decides otherwise.
  const host = given('HOST') ?? (seed === 'demo' ? '127.0.0.1' : '0.0.0.0');
  const directory = given('DATA_DIR');
  const dataDirectory = directory ? resolve(base, directory) : join(REPOSITORY_ROOT, 'data');

  if (faults.length > 0) throw new ConfigurationError(faults);
  return new Environment({ port, host, dataDirectory, seed, mailUrl, appUrl });
}

function readPort(text: string | undefined, faults: string[]): number {
  if (text === undefined) return 3000;
  const port = Number(text);
  if (!/^\d{1,5}$/.test(text) || port > 65535) {
    faults.push(`PORT must be a whole number from 0 to 65535, but is "${text}"`);
  }
  return port;
}

function readSeed(text: string | undefined, faults: string[]): Seed {
  const seed = SEEDS.find((known) => known === (text ?? 'none'));
  if (seed === undefined) faults.push(`SEED must be one of ${SEEDS.join(', ')}, but is "${text}"`);
  return seed ?? 'none';
}

function readMailUrl(text: string | undefined, faults: string[]): string | undefined {
  if (text === undefined) return undefined;
  const url = URL.canParse(text) ? new URL(text) : undefined;
  // The address may carry a password, so the message does not repeat it.
  if (!url?.hostname || !['smtp:', 'smtps:'].includes(url.protocol)) {
    faults.push('MAIL_URL must be an address such as smtp://mail.example.com:25 or smtps://…');
  }
  return text;
}

function readAppUrl(text: string | undefined, faults: string[]): string | undefined {
  if (text === undefined) return undefined;
  const url = URL.canParse(text) ? new URL(text) : undefined;
  const isOrigin = url && url.pathname === '/' && !url.search && !url.hash && !url.username;
  if (!isOrigin || !['http:', 'https:'].includes(url.protocol)) {
    faults.push(
      `APP_URL must be an address such as https://resistry.example.com without a path, but is "${text}"`,
    );
    return undefined;
  }
  return url.origin;
}
