import { createHmac, randomBytes } from 'node:crypto';
import { chmodSync, existsSync, linkSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { ConfigurationError } from './configuration-error';

const SECRET_BYTES = 48;

/** The secrets of this installation, made on its first start and kept readable for its owner only. */
export class Secrets {
  private constructor(
    /** Signs access tokens. */
    readonly accessTokenKey: string,
    private readonly mailedTokenKey: string,
  ) {}

  /** @throws ConfigurationError when a secret is there but too short to be one */
  static openIn(folder: string): Secrets {
    mkdirSync(folder, { recursive: true, mode: 0o700 });
    chmodSync(folder, 0o700);
    return new Secrets(readOrCreate(folder, 'access-token.key'), readOrCreate(folder, 'mailed-token.key'));
  }

  /**
   * The token that goes out by mail for one invitation or reset. It follows from the secret, so that a mail sent
   * twice carries the same one and neither database nor outbox ever holds it in the clear.
   */
  mailedToken(purpose: 'invitation' | 'password-reset', id: string): string {
    return createHmac('sha256', this.mailedTokenKey).update(`${purpose}:${id}`).digest('base64url');
  }
}

function readOrCreate(folder: string, name: string): string {
  const file = join(folder, name);
  if (!existsSync(file)) {
    // Written aside and linked into place: a crash leaves no half secret and a second start no other one.
    const draft = join(folder, `.${name}.${randomBytes(6).toString('hex')}`);
    writeFileSync(draft, randomBytes(SECRET_BYTES).toString('base64url'), { mode: 0o600, flush: true });
    try {
      linkSync(draft, file);
    } catch (error) {
      if (!existsSync(file)) throw error;
    } finally {
      rmSync(draft);
    }
  }
  chmodSync(file, 0o600);
  const secret = readFileSync(file, 'utf8').trim();
  if (secret.length < 32) throw new ConfigurationError([`DATA_DIR holds a damaged secret: ${file}`]);
  return secret;
}
