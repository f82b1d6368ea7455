import { mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ConfigurationError } from './configuration-error';
import { Secrets } from './secrets';

describe('the secrets of an installation', () => {
  let folder: string;
  beforeEach(() => {
    folder = join(mkdtempSync(join(tmpdir(), 'resistry-secrets-')), 'secrets');
  });
  afterEach(() => {
    rmSync(join(folder, '..'), { recursive: true });
  });

  it('are made on the first start, for the owner only, and found again on the next', () => {
    const first = Secrets.openIn(folder);
    expect(statSync(folder).mode & 0o777).toBe(0o700);
    expect(statSync(join(folder, 'access-token.key')).mode & 0o777).toBe(0o600);
    expect(Secrets.openIn(folder).accessTokenKey).toBe(first.accessTokenKey);
    // 48 random bytes are 64 characters of base64url.
    expect(readFileSync(join(folder, 'access-token.key'), 'utf8')).toMatch(/^[\w-]{64}$/);
  });

  it('give a mailed token that is the same each time, another for each purpose and id', () => {
    const secrets = Secrets.openIn(folder);
    const token = secrets.mailedToken('invitation', 'a');
    expect(secrets.mailedToken('invitation', 'a')).toBe(token);
    expect(
      new Set([token, secrets.mailedToken('invitation', 'b'), secrets.mailedToken('password-reset', 'a')])
        .size,
    ).toBe(3);
  });

  it('are refused when the file is damaged, rather than replaced', () => {
    Secrets.openIn(folder);
    writeFileSync(join(folder, 'access-token.key'), 'short');
    expect(() => Secrets.openIn(folder)).toThrow(ConfigurationError);
  });
});
