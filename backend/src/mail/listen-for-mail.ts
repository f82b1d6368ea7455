import { SMTPServer, type SMTPServerDataStream } from 'smtp-server';
import type { MailBox } from './mail-box';

const LARGEST_LETTER_BYTES = 1_000_000;

/**
 * Takes letters by SMTP, from anybody and without encryption, and keeps each in the box: for a demonstration, never
 * for a network that strangers reach.
 *
 * @param port 0 takes any free one
 * @param onError told of what fails beside the conversation with a sender
 * @throws Error when the port cannot be had
 */
export async function listenForMail(
  box: MailBox,
  port: number,
  host: string,
  onError: (error: Error) => void,
): Promise<SMTPServer> {
  const server = new SMTPServer({
    disabledCommands: ['STARTTLS', 'AUTH'],
    authOptional: true,
    size: LARGEST_LETTER_BYTES,
    onData: (stream, _session, done) => {
      readLetter(stream)
        .then((source) => box.keep(source))
        .then(
          () => done(),
          (error: unknown) => done(error instanceof Error ? error : new Error(String(error))),
        );
    },
  });
  await new Promise<void>((resolve, reject) => {
    server.on('error', reject);
    server.listen(port, host, resolve);
  });
  server.removeAllListeners('error').on('error', onError);
  return server;
}

/** `size` is only announced to the sender: what is sent all the same is read to its end, so that it can be answered, and not kept. */
async function readLetter(stream: SMTPServerDataStream): Promise<Buffer> {
  const pieces: Buffer[] = [];
  let bytes = 0;
  for await (const piece of stream as AsyncIterable<Buffer>) {
    bytes += piece.length;
    if (bytes <= LARGEST_LETTER_BYTES) pieces.push(piece);
  }
  if (bytes > LARGEST_LETTER_BYTES) {
    throw Object.assign(new Error(`A letter has at most ${LARGEST_LETTER_BYTES} bytes.`), {
      responseCode: 552,
    });
  }
  return Buffer.concat(pieces);
}

export function closeMailServer(server: SMTPServer): Promise<void> {
  return new Promise((resolve) => server.close(resolve));
}
