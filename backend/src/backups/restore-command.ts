import { ConfigurationError } from '../config/configuration-error';
import { readEnvironment } from '../config/environment';
import { restoreBackup, RestoreRefused } from './restore-backup';

/** `npm run restore -w backend -- <name>`, with the server stopped. */
async function main(): Promise<void> {
  // What this process writes is for its owner only.
  process.umask(0o077);
  const [name] = process.argv.slice(2);
  if (name === undefined) throw new RestoreRefused('Say which backup: npm run restore -w backend -- <name>');
  const environment = readEnvironment(process.env, process.env['INIT_CWD'] ?? process.cwd());
  const aside = await restoreBackup(environment, name, new Date());
  process.stdout.write(`The backup ${name} is in place.\n`);
  if (aside !== undefined) process.stdout.write(`What it replaced lies in ${aside}.\n`);
}

main().catch((error: unknown) => {
  const expected = error instanceof RestoreRefused || error instanceof ConfigurationError;
  const words =
    error instanceof Error ? (expected ? error.message : (error.stack ?? error.message)) : String(error);
  process.stderr.write(`${words}\n`);
  process.exitCode = 1;
});
