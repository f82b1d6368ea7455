import { Injectable } from '@nestjs/common';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import sqlite3 from 'sqlite3';
import { Environment } from '../config/environment';
import { type BindValues, checkBindValues } from './bind-values';
import { dialectModule } from './dialect-module';
import { READER_PRAGMAS } from './pragmas';

/** A read-only connection and how many queries wait on it. */
interface Lane {
  sequelize: Sequelize;
  waiting: number;
}

/**
 * Reading without ever waiting for the writer. A connection runs one query at a time, so long searches share two of
 * them, and look-ups of single rows have one of their own.
 */
@Injectable()
export class Readers {
  private readonly lanes: readonly [Lane, Lane];
  private readonly lookUpLane: Lane;

  constructor(environment: Environment) {
    const open = (): Lane => ({ sequelize: openReader(environment.databaseFile), waiting: 0 });
    this.lanes = [open(), open()];
    this.lookUpLane = open();
  }

  /**
   * Runs one SELECT. Values come in by `$name` only, exactly the names used.
   *
   * @returns rows as the SQL names their columns
   */
  async select<Row extends object>(sql: string, bind: BindValues = {}): Promise<Row[]> {
    const [first, second] = this.lanes;
    return query<Row>(second.waiting < first.waiting ? second : first, sql, bind);
  }

  /** Runs a SELECT that finds at most a few rows by an index; never waits behind a search. */
  async lookUp<Row extends object>(sql: string, bind: BindValues = {}): Promise<Row | undefined> {
    const rows = await query<Row>(this.lookUpLane, sql, bind);
    return rows[0];
  }

  async close(): Promise<void> {
    await Promise.all([...this.lanes, this.lookUpLane].map((lane) => lane.sequelize.close()));
  }
}

function openReader(file: string): Sequelize {
  return new Sequelize({
    dialect: 'sqlite',
    storage: file,
    logging: false,
    dialectModule: dialectModule(READER_PRAGMAS),
    dialectOptions: { mode: sqlite3.OPEN_READONLY },
  });
}

async function query<Row extends object>(lane: Lane, sql: string, bind: BindValues): Promise<Row[]> {
  checkBindValues(bind);
  lane.waiting += 1;
  try {
    return await lane.sequelize.query<Row>(sql, { type: QueryTypes.SELECT, raw: true, bind: { ...bind } });
  } finally {
    lane.waiting -= 1;
  }
}
