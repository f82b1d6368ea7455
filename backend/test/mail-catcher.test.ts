import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import request from 'supertest';
import { createTransport } from 'nodemailer';
import { startApplication } from './support/application';
import { lettersTo, tokenIn } from './support/mail';
import { MAIL_CATCHER, ServerProcess } from './support/server-process';
import { temporaryFolder } from './support/temporary-folder';

describe('the mail catcher as a process', () => {
  const folder = temporaryFolder();
  const data = (): string => folder.path('data');
  const catchers: ServerProcess[] = [];
  afterEach(async () => {
    for (const catcher of catchers.splice(0)) await catcher.end('SIGKILL');
  });

  const startCatcher = async (variables: Record<string, string> = {}): Promise<ServerProcess> => {
    const catcher = await ServerProcess.start({ DATA_DIR: data(), ...variables }, MAIL_CATCHER);
    catchers.push(catcher);
    return catcher;
  };

  it('keeps what the application sends, for administrators to read, and ends well on SIGTERM', async () => {
    const catcher = await startCatcher();
    const application = await startApplication({
      dataDirectory: data(),
      environment: { MAIL_URL: `smtp://${catcher.url}` },
    });
    const administrator = await application.people.signIn('administrator');
    const designer = await application.people.add('designer');
    await request(application.server)
      .post('/api/auth/password-resets')
      .send({ email: designer.email })
      .expect(202);
    await application.delivered();
    const [letter] = await lettersTo(administrator, designer.email);
    expect(tokenIn(letter).length).toBeGreaterThan(20);
    const mail = join(data(), 'mail');
    const names = readdirSync(mail);
    expect(names).toHaveLength(1);
    // The letter lets somebody in: it is for the owner of the process only.
    expect(statSync(join(mail, names[0] ?? '')).mode & 0o077).toBe(0);
    await request(application.server)
      .post('/api/auth/password-resets/redeem')
      .send({ token: tokenIn(letter), password: 'another-gauge-43' })
      .expect(204);
    await application.close();
    expect(await catcher.end('SIGTERM')).toBe(0);
  });

  it('takes letters one after the other and refuses one that is too large', async () => {
    const catcher = await startCatcher();
    const transport = createTransport({ url: `smtp://${catcher.url}` });
    const send = (at: number, text: string): Promise<unknown> =>
      transport.sendMail({
        from: 'no-reply@example.com',
        to: 'owner@example.com',
        subject: `Letter ${at}`,
        text,
        messageId: `<letter-${at}@example.com>`,
      });
    await send(1, 'One');
    await expect(send(2, 'x'.repeat(1_200_000))).rejects.toThrow('552');
    await send(3, 'Three');
    transport.close();
    expect(readdirSync(join(data(), 'mail')).sort()).toEqual(['letter-1.eml', 'letter-3.eml']);
    expect(await catcher.end('SIGTERM')).toBe(0);
  });

  it('does not start where it is told nonsense or its port is taken, and says why', async () => {
    await expect(startCatcher({ PORT: 'x' })).rejects.toThrow('PORT must be a whole number');
    const taken = await new Promise<Server>((resolve) => {
      const server = createServer().listen(0, '127.0.0.1', () => resolve(server));
    });
    const { port } = taken.address() as AddressInfo;
    await expect(startCatcher({ PORT: String(port) })).rejects.toThrow('EADDRINUSE');
    await new Promise((resolve) => taken.close(resolve));
  });
});
