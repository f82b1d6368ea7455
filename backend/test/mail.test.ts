import { readdirSync, readFileSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { buffer } from 'node:stream/consumers';
import { type ParsedMail, simpleParser } from 'mailparser';
import request from 'supertest';
import { SMTPServer } from 'smtp-server';
import { Writer } from '../src/database/writer';
import { type Letter as LetterToSend, MAIL } from '../src/mail/mail-topic';
import { Mailer } from '../src/mail/mailer';
import { Outbox } from '../src/outbox/outbox';
import { startApplication, type StartedApplication } from './support/application';
import { lettersTo } from './support/mail';
import type { SignedInPerson } from './support/people-builder';

const LETTER: LetterToSend = {
  to: 'owner@brackwater.example.com',
  subject: 'Grün: 4,7 kΩ is discontinued',
  text: 'See http://localhost:3000/parts/7 and https://resistry.example.com/parts?q=a%20b for more.\n.\nA line after a dot.',
};

async function send(application: StartedApplication, letter: LetterToSend): Promise<string> {
  const writer = application.nest.get(Writer);
  const id = await writer.transaction((transaction) =>
    application.nest.get(Outbox).add(transaction, MAIL, letter),
  );
  await application.delivered();
  return id;
}

describe('mail, where no mail server is set', () => {
  let application: StartedApplication;
  let administrator: SignedInPerson;
  beforeAll(async () => {
    application = await startApplication();
    administrator = await application.people.signIn('administrator');
  });
  afterAll(() => application.stop());

  it('is kept as files and read by administrators', async () => {
    const id = await send(application, LETTER);
    const [letter] = await lettersTo(administrator, LETTER.to);
    expect(letter).toMatchObject({
      id,
      to: LETTER.to,
      subject: LETTER.subject,
      from: '"Resistry" <no-reply@localhost>',
    });
    expect(letter?.text.trim()).toBe(LETTER.text);
    expect(letter?.links).toEqual([
      'http://localhost:3000/parts/7',
      'https://resistry.example.com/parts?q=a%20b',
    ]);
    expect(readFileSync(join(application.dataDirectory, 'mail', `${id}.eml`), 'utf8')).toContain(
      `Message-ID: <${id}@localhost>`,
    );
  });

  it('is there once although it was sent twice', async () => {
    const letter = { ...LETTER, to: 'twice@brackwater.example.com' };
    const id = await send(application, letter);
    await application.nest.get(Mailer, { strict: false }).send(letter, id);
    expect(await lettersTo(administrator, letter.to)).toHaveLength(1);
  });

  it('cannot be given other headers by what stands in a subject', async () => {
    const letter = {
      ...LETTER,
      to: 'plain@brackwater.example.com',
      subject: 'One\r\nBcc: thief@example.com',
    };
    await send(application, letter);
    const [kept] = await lettersTo(administrator, letter.to);
    expect(kept?.subject).toBe('One Bcc: thief@example.com');
    expect(await lettersTo(administrator, 'thief@example.com')).toEqual([]);
  });

  it('comes by pages, newest first', async () => {
    const { total } = (await administrator.get('/api/mail?limit=1').expect(200)).body as { total: number };
    expect(total).toBe(readdirSync(join(application.dataDirectory, 'mail')).length);
    const all = (await administrator.get('/api/mail').expect(200)).body as {
      kept: boolean;
      items: { id: string }[];
    };
    expect(all.kept).toBe(true);
    const second = (await administrator.get('/api/mail?limit=1&offset=1').expect(200)).body as {
      items: { id: string }[];
    };
    expect(second.items[0]?.id).toBe(all.items[1]?.id);
    for (const query of ['limit=0', 'limit=101', 'offset=-1', 'limit=x'])
      await administrator.get(`/api/mail?${query}`).expect(400);
  });

  it.each(['nothing', '..%2Fsecrets%2Faccess-token.key', '%2e%2e', 'a.eml'])(
    'has no letter %s',
    async (id) => {
      await administrator.get(`/api/mail/${id}`).expect(404);
    },
  );

  it('is for administrators', async () => {
    await (await application.people.signIn('component-engineer')).get('/api/mail').expect(403);
    await request(application.server).get('/api/mail').expect(401);
  });
});

describe('mail, where a mail server is set', () => {
  let server: SMTPServer;
  let arrived: ParsedMail[];
  let application: StartedApplication;
  beforeAll(async () => {
    arrived = [];
    server = new SMTPServer({
      authOptional: true,
      disabledCommands: ['STARTTLS', 'AUTH'],
      onData: (stream, _session, done) => {
        void buffer(stream)
          .then((source) => simpleParser(source))
          .then((mail) => {
            arrived.push(mail);
            done();
          });
      },
    });
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    const { port } = server.server.address() as AddressInfo;
    application = await startApplication({
      environment: { MAIL_URL: `smtp://127.0.0.1:${port}`, APP_URL: 'http://resistry.example.com' },
    });
  });
  afterAll(async () => {
    await application.stop();
    await new Promise<void>((resolve) => server.close(resolve));
  });

  it('goes there and does not stay here', async () => {
    const id = await send(application, LETTER);
    expect(arrived).toHaveLength(1);
    expect(arrived[0]).toMatchObject({ messageId: `<${id}@resistry.example.com>`, subject: LETTER.subject });
    expect(arrived[0]?.from?.text).toBe('"Resistry" <no-reply@resistry.example.com>');
    const administrator = await application.people.signIn('administrator');
    expect((await administrator.get('/api/mail').expect(200)).body).toEqual({
      kept: false,
      total: 0,
      items: [],
    });
  });

  it('is tried again when the server is away', async () => {
    const administrator = await application.people.signIn('administrator');
    await new Promise<void>((resolve) => server.close(resolve));
    await send(application, LETTER);
    const { items } = (await administrator.get('/api/outbox').expect(200)).body as { items: unknown[] };
    expect(items).toEqual([expect.objectContaining({ kind: 'mail', state: 'pending', attempts: 1 })]);
  });
});
