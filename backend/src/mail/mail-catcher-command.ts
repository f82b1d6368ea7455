import type { AddressInfo } from 'node:net';
import { ConfigurationError } from '../config/configuration-error';
import { readEnvironment } from '../config/environment';
import { closeMailServer, listenForMail } from './listen-for-mail';
import { MailBox } from './mail-box';

/**
 * `node backend/dist/mail/mail-catcher-command.js`: a mail server beside the application that keeps every letter under
 * DATA_DIR/mail and sends none on. It listens at HOST and PORT, as the application does at its own.
 */
async function main(): Promise<void> {
  // What this process writes is for its owner only.
  process.umask(0o077);
  const environment = readEnvironment(process.env, process.env['INIT_CWD'] ?? process.cwd());
  const server = await listenForMail(
    new MailBox(environment),
    environment.port,
    environment.host,
    (error) => void process.stderr.write(`${error.message}\n`),
  );
  const stop = (): void => {
    void closeMailServer(server).then(() => process.exit(0));
  };
  process.once('SIGTERM', stop);
  process.once('SIGINT', stop);
  // Asked for port 0, the system gives one that is free.
  const { port } = server.server.address() as AddressInfo;
  process.stdout.write(`Keeping mail that arrives at ${environment.host}:${port}\n`);
}

main().catch((error: unknown) => {
  const words = error instanceof ConfigurationError ? error.message : error;
  process.stderr.write(`${words instanceof Error ? (words.stack ?? words.message) : String(words)}\n`);
  process.exitCode = 1;
});
