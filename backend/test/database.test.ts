import { Readers } from '../src/database/readers';
import { Writer } from '../src/database/writer';
import { UserModel } from '../src/users/models/user.model';
import { startApplication, type StartedApplication } from './support/application';

const INSERT = `INSERT INTO failed_sign_ins (account, address, failed_at) VALUES ($account, '', '2026-12-01')`;

describe('the database', () => {
  let application: StartedApplication;
  let writer: Writer;
  let readers: Readers;
  beforeAll(async () => {
    application = await startApplication();
    writer = application.nest.get(Writer);
    readers = application.nest.get(Readers);
  });
  afterAll(() => application.stop());

  const count = async (account: string): Promise<number> => {
    const row = await readers.lookUp<{ n: number }>(
      'SELECT count(*) AS n FROM failed_sign_ins WHERE account = $account',
      {
        account,
      },
    );
    return row?.n ?? -1;
  };

  it('keeps all of a transaction or nothing', async () => {
    await writer.transaction(async (transaction) => {
      expect(await writer.run(transaction, INSERT, { account: 'kept' })).toBe(1);
    });
    await expect(
      writer.transaction(async (transaction) => {
        await writer.run(transaction, INSERT, { account: 'dropped' });
        throw new Error('no');
      }),
    ).rejects.toThrow('no');
    expect([await count('kept'), await count('dropped')]).toEqual([1, 0]);
  });

  it('reads inside a transaction what it has written, and outside only what is committed', async () => {
    await writer.transaction(async (transaction) => {
      await writer.run(transaction, INSERT, { account: 'seen' });
      const rows = await writer.select(
        transaction,
        'SELECT 1 FROM failed_sign_ins WHERE account = $account',
        { account: 'seen' },
      );
      expect(rows).toHaveLength(1);
      expect(await count('seen')).toBe(0);
    });
    expect(await count('seen')).toBe(1);
  });

  it('counts the rows that a statement changed, and gives ids and what RETURNING returns', async () => {
    await writer.transaction(async (transaction) => {
      await writer.run(transaction, INSERT, { account: 'many' });
      await writer.run(transaction, INSERT, { account: 'many' });
      const changed = await writer.run(
        transaction,
        'UPDATE failed_sign_ins SET forgiven = 1 WHERE account = $account',
        { account: 'many' },
      );
      expect(changed).toBe(2);
      const id = await writer.insert(transaction, INSERT, { account: 'told' });
      await expect(
        writer.select(
          transaction,
          'UPDATE failed_sign_ins SET forgiven = 1 WHERE id = $id RETURNING account',
          { id },
        ),
      ).resolves.toEqual([{ account: 'told' }]);
      expect(
        await writer.run(transaction, 'DELETE FROM failed_sign_ins WHERE account = $account', {
          account: 'none',
        }),
      ).toBe(0);
    });
  });

  it('loses no update of many that read before they write', async () => {
    await writer.transaction((transaction) => writer.run(transaction, INSERT, { account: 'counter' }));
    const increment = (): Promise<void> =>
      writer.transaction(async (transaction) => {
        const [row] = await writer.select<{ address: string }>(
          transaction,
          `SELECT address FROM failed_sign_ins WHERE account = 'counter'`,
        );
        const next = Number(row?.address ?? '') + 1;
        await writer.run(
          transaction,
          `UPDATE failed_sign_ins SET address = $next WHERE account = 'counter'`,
          { next: String(next) },
        );
      });
    await Promise.all(Array.from({ length: 50 }, increment));
    await expect(
      readers.lookUp(`SELECT address FROM failed_sign_ins WHERE account = 'counter'`),
    ).resolves.toEqual({ address: '50' });
  });

  it('refuses a transaction inside another one, which would wait for ever', async () => {
    await expect(writer.transaction(() => writer.transaction(() => Promise.resolve()))).rejects.toThrow(
      'inside another one',
    );
  });

  it('refuses models outside a transaction', async () => {
    await expect(UserModel.findAll()).rejects.toThrow('outside Writer.transaction');
    await expect(UserModel.create({ email: 'a@example.com' })).rejects.toThrow('outside Writer.transaction');
    await expect(UserModel.update({ name: 'x' }, { where: {} })).rejects.toThrow(
      'outside Writer.transaction',
    );
    await expect(UserModel.destroy({ where: {} })).rejects.toThrow('outside Writer.transaction');
  });

  it('runs its pragmas on every connection', async () => {
    const onEach = Array.from({ length: 3 }, () =>
      writer.transaction(async (transaction) => [
        ...(await writer.select(transaction, 'PRAGMA synchronous')),
        ...(await writer.select(transaction, 'SELECT foreign_keys FROM pragma_foreign_keys')),
        ...(await writer.select(transaction, 'SELECT recursive_triggers FROM pragma_recursive_triggers')),
        ...(await writer.select(transaction, 'PRAGMA journal_mode')),
      ]),
    );
    // synchronous 2 is FULL.
    const expected = [
      { synchronous: 2 },
      { foreign_keys: 1 },
      { recursive_triggers: 1 },
      { journal_mode: 'wal' },
    ];
    expect(await Promise.all(onEach)).toEqual([expected, expected, expected]);
  });

  it('holds references', async () => {
    const orphan = writer.transaction((transaction) =>
      writer.run(transaction, `INSERT INTO user_roles (user_id, role) VALUES (4711, 'designer')`),
    );
    await expect(orphan).rejects.toThrow('FOREIGN KEY');
  });

  it('reads only, through the readers', async () => {
    await expect(readers.select(`DELETE FROM failed_sign_ins RETURNING id`)).rejects.toThrow('readonly');
  });

  it('binds values exactly: quotes stay text, and a missing, surplus or non-finite value is refused', async () => {
    const text = `' OR 1=1 -- $other "x"`;
    await expect(readers.lookUp('SELECT $text AS text', { text })).resolves.toEqual({ text });
    await expect(readers.select('SELECT $text AS text', {})).rejects.toThrow();
    await expect(readers.select('SELECT 1', { surplus: 1 })).rejects.toThrow();
    await expect(readers.select('SELECT $x', { x: Number.NaN })).rejects.toThrow(RangeError);
    await expect(readers.select('SELECT $x', { x: Infinity })).rejects.toThrow(RangeError);
  });

  it('answers a look-up while long queries keep both other connections busy', async () => {
    const order: string[] = [];
    const long = `WITH RECURSIVE n (i) AS (SELECT 1 UNION ALL SELECT i + 1 FROM n WHERE i < 300000) SELECT max(i) FROM n`;
    const searches = [1, 2, 3].map(async () => {
      await readers.select(long);
      order.push('search');
    });
    await readers.lookUp('SELECT 1');
    order.push('look-up');
    await Promise.all(searches);
    expect(order[0]).toBe('look-up');
  });
});
