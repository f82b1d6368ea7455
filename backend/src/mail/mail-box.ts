import { randomUUID } from 'node:crypto';
import { mkdir, readdir, readFile, rename, stat, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { Injectable } from '@nestjs/common';
import { type ParsedMail, simpleParser } from 'mailparser';
import { Environment } from '../config/environment';

const SUFFIX = '.eml';
const IDENTIFIER = /^[\w-]{1,80}$/;

export interface CaughtMail {
  id: string;
  mail: ParsedMail;
}

/** The mail that the local catcher keeps, one file a letter under DATA_DIR/mail. */
@Injectable()
export class MailBox {
  private readonly folder: string;

  constructor(environment: Environment) {
    this.folder = environment.folder('mail');
  }

  /** Keeps a letter under its Message-ID, so that one which arrives twice is there once. */
  async keep(source: Buffer): Promise<void> {
    const { messageId } = await simpleParser(source, { skipHtmlToText: true, skipTextToHtml: true });
    const id = messageId?.replace(/^<|@.*$/g, '') ?? '';
    await mkdir(this.folder, { recursive: true });
    const draft = join(this.folder, `.${randomUUID()}`);
    await writeFile(draft, source, { mode: 0o600 });
    await rename(draft, join(this.folder, `${IDENTIFIER.test(id) ? id : randomUUID()}${SUFFIX}`));
  }

  /** The newest letters first, `limit` of them from `offset` on, and how many there are. */
  async list(offset: number, limit: number): Promise<{ total: number; letters: CaughtMail[] }> {
    const names = await this.names();
    const times = await Promise.all(
      names.map(async (name) => ({ name, time: (await stat(join(this.folder, name))).mtimeMs })),
    );
    times.sort((one, other) => other.time - one.time || one.name.localeCompare(other.name));
    const shown = times.slice(offset, offset + limit).map(({ name }) => name.slice(0, -SUFFIX.length));
    const letters = await Promise.all(shown.map((id) => this.find(id)));
    return { total: names.length, letters: letters.filter((letter) => letter !== undefined) };
  }

  /** @returns undefined when there is no such letter */
  async find(id: string): Promise<CaughtMail | undefined> {
    if (!IDENTIFIER.test(id) || !(await this.names()).includes(`${id}${SUFFIX}`)) return undefined;
    const source = await readFile(join(this.folder, `${id}${SUFFIX}`));
    return { id, mail: await simpleParser(source, { skipTextToHtml: true, skipHtmlToText: true }) };
  }

  private async names(): Promise<string[]> {
    await mkdir(this.folder, { recursive: true, mode: 0o700 });
    return (await readdir(this.folder)).filter((name) => name.endsWith(SUFFIX));
  }
}
