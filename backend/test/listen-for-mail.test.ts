import { readdirSync, readFileSync, mkdtempSync, rmSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';
import { readEnvironment } from '../src/config/environment';
import { closeMailServer, listenForMail } from '../src/mail/listen-for-mail';
import { MailBox } from '../src/mail/mail-box';

describe('the mail server of the demonstration', () => {
  let folder: string;
  beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'resistry-mail-'))));
  afterEach(() => rmSync(folder, { recursive: true }));

  it('takes what is sent to its address and keeps it', async () => {
    const box = new MailBox(readEnvironment({ DATA_DIR: folder }));
    const server = await listenForMail(box, 0, '127.0.0.1', fail);
    const { port } = server.server.address() as AddressInfo;
    const transport = createTransport({ url: `smtp://127.0.0.1:${port}` });
    await transport.sendMail({
      from: 'no-reply@example.com',
      to: 'owner@example.com',
      subject: 'Kept',
      text: 'One letter',
      messageId: '<4f1c@example.com>',
    });
    transport.close();
    await closeMailServer(server);
    expect(readdirSync(join(folder, 'mail'))).toEqual(['4f1c.eml']);
    expect(readFileSync(join(folder, 'mail', '4f1c.eml'), 'utf8')).toContain('One letter');
  });

  it('says so when its port is taken', async () => {
    const box = new MailBox(readEnvironment({ DATA_DIR: folder }));
    const first = await listenForMail(box, 0, '127.0.0.1', fail);
    const { port } = first.server.address() as AddressInfo;
    await expect(listenForMail(box, port, '127.0.0.1', fail)).rejects.toThrow('EADDRINUSE');
    await closeMailServer(first);
  });
});

function fail(error: Error): void {
  throw error;
}
