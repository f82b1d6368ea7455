import type { Transaction } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';

/**
 * Models belong to the writer: outside a transaction they would read and write past its mutex on a connection of
 * their own. Refusing here finds a forgotten `{ transaction }` in the first test that runs it.
 */
export function requireTransactions(sequelize: Sequelize): void {
  const refuse = (options?: { transaction?: Transaction | null }): void => {
    if (!options?.transaction)
      throw new Error('A model was used outside Writer.transaction: pass { transaction }.');
  };
  sequelize.addHook('beforeFind', (options) => refuse(options));
  sequelize.addHook('beforeCount', (options) => refuse(options));
  sequelize.addHook('beforeCreate', (_instance, options) => refuse(options));
  sequelize.addHook('beforeUpdate', (_instance, options) => refuse(options));
  sequelize.addHook('beforeDestroy', (_instance, options) => refuse(options));
  sequelize.addHook('beforeUpsert', (_values, options) => refuse(options));
  sequelize.addHook('beforeBulkCreate', (_instances, options) => refuse(options));
  sequelize.addHook('beforeBulkUpdate', (options) => refuse(options));
  sequelize.addHook('beforeBulkDestroy', (options) => refuse(options));
}
