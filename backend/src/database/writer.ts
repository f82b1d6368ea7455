import { AsyncLocalStorage } from 'node:async_hooks';
import { Injectable } from '@nestjs/common';
import { QueryTypes, Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { type BindValues, checkBindValues } from './bind-values';
import { Mutex } from './mutex';

/**
 * The only way to change the database: one transaction at a time, each holding SQLite's write lock from its start,
 * so that what it has read is still true when it writes.
 */
@Injectable()
export class Writer {
  private readonly mutex = new Mutex();
  private readonly running = new AsyncLocalStorage<true>();

  constructor(private readonly sequelize: Sequelize) {}

  /**
   * Runs the work in one transaction and commits when it resolves; when it rejects, nothing has happened.
   *
   * @throws Error when called inside another transaction, which would wait for itself for ever
   */
  async transaction<Result>(work: (transaction: Transaction) => Promise<Result>): Promise<Result> {
    if (this.running.getStore()) {
      throw new Error('A transaction was asked for inside another one: hand the running one on instead.');
    }
    return this.mutex.run(() =>
      this.running.run(true, () =>
        this.sequelize.transaction({ type: Transaction.TYPES.IMMEDIATE }, (transaction) => work(transaction)),
      ),
    );
  }

  /** Reads through a running transaction: sees what it has written so far. Values by `$name` only. */
  async select<Row extends object>(
    transaction: Transaction,
    sql: string,
    bind: BindValues = {},
  ): Promise<Row[]> {
    checkBindValues(bind);
    return this.sequelize.query<Row>(sql, {
      type: QueryTypes.SELECT,
      raw: true,
      transaction,
      bind: { ...bind },
    });
  }

  /**
   * Executes one INSERT of one row. Values by `$name` only.
   *
   * @returns the id (rowid) of the new row
   */
  async insert(transaction: Transaction, sql: string, bind: BindValues = {}): Promise<number> {
    checkBindValues(bind);
    const [id] = await this.sequelize.query(sql, {
      type: QueryTypes.INSERT,
      raw: true,
      transaction,
      bind: { ...bind },
    });
    return id;
  }

  /**
   * Executes one INSERT, UPDATE or DELETE. Values by `$name` only. (What `UPDATE … RETURNING` gives comes by
   * `select`.)
   *
   * @returns how many rows it changed
   */
  async run(transaction: Transaction, sql: string, bind: BindValues = {}): Promise<number> {
    checkBindValues(bind);
    return this.sequelize.query(sql, {
      type: QueryTypes.BULKUPDATE,
      raw: true,
      transaction,
      bind: { ...bind },
    });
  }
}
