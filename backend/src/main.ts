import { createApplication } from './create-application';
import { ConfigurationError } from './config/configuration-error';
import { readEnvironment } from './config/environment';
import { SearchIndex } from './search/search-index';

// SQLite and bcrypt work in libuv's pool, whose four threads a few searches would fill. It must be set before the
// pool starts, which is at the first file that anything reads.
process.env['UV_THREADPOOL_SIZE'] ??= '16';

const DRAIN_SECONDS = 15;

async function main(): Promise<void> {
  // What this process writes is for its owner only.
  process.umask(0o077);
  const environment = readEnvironment(process.env, process.env['INIT_CWD'] ?? process.cwd());
  const application = await createApplication(environment);
  const stop = (): void => {
    // What is being answered gets its answer; whatever takes longer than this does not hold the machine up.
    setTimeout(() => process.exit(1), DRAIN_SECONDS * 1000).unref();
    application.close().then(
      () => process.exit(0),
      () => process.exit(1),
    );
  };
  process.once('SIGTERM', stop);
  process.once('SIGINT', stop);
  // Fills an empty database when asked to: only then is there a catalogue to read.
  await application.init();
  // The first search would otherwise wait until the catalogue is in memory.
  await application.get(SearchIndex).ready();
  await application.listen(environment.port, environment.host);
  process.stdout.write(`Resistry answers at ${await application.getUrl()}\n`);
}

main().catch((error: unknown) => {
  const words = error instanceof ConfigurationError ? error.message : error;
  process.stderr.write(`${words instanceof Error ? (words.stack ?? words.message) : String(words)}\n`);
  process.exit(1);
});
