import { parseArgs } from 'node:util';
import { NestFactory } from '@nestjs/core';
import { isEmail } from 'class-validator';
import { AppModule } from '../app.module';
import { Problem } from '../common/problems/problem';
import { ApplicationOptions } from '../config/application-options';
import { ConfigurationError } from '../config/configuration-error';
import { readEnvironment } from '../config/environment';
import { FirstAdministrator } from './first-administrator';

const USAGE =
  'Say whom: npm run create-administrator -w backend -- --email kim@example.com --name "Kim Example"';

/** Thrown with words for whoever gave the command. */
class CommandRefused extends Error {
  override readonly name = 'CommandRefused';
}

/** `npm run create-administrator -w backend -- --email … --name …`, with the server stopped. */
async function main(): Promise<void> {
  // What this process writes is for its owner only.
  process.umask(0o077);
  const { email, name } = readArguments(process.argv.slice(2));
  const environment = readEnvironment(process.env, process.env['INIT_CWD'] ?? process.cwd());
  const options = new ApplicationOptions({ logLevel: 'silent' });
  const application = await NestFactory.createApplicationContext(AppModule.with(environment, options), {
    logger: false,
    abortOnError: false,
  });
  try {
    const link = await application.get(FirstAdministrator, { strict: false }).create(email, name);
    process.stdout.write(
      `${name} administers. The password is chosen here, once and within a day:\n${link}\n`,
    );
  } finally {
    await application.close();
  }
}

function readArguments(words: string[]): { email: string; name: string } {
  try {
    const { values } = parseArgs({
      args: words,
      options: { email: { type: 'string' }, name: { type: 'string' } },
    });
    const [email, name] = [values.email?.trim() ?? '', values.name?.trim() ?? ''];
    if (isEmail(email) && name.length > 0 && !/\p{Cc}/u.test(name)) return { email, name };
  } catch {
    // An unknown option: the usage says which are known.
  }
  throw new CommandRefused(USAGE);
}

main().catch((error: unknown) => {
  const expected =
    error instanceof CommandRefused || error instanceof ConfigurationError || error instanceof Problem;
  const words = error instanceof Error ? error.message : String(error);
  const isLocked = words.includes('in use by a running server');
  const shown = expected || isLocked || !(error instanceof Error) ? words : (error.stack ?? words);
  process.stderr.write(`${shown}\n`);
  process.exitCode = 1;
});
