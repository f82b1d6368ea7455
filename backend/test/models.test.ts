import { QueryTypes } from 'sequelize';
import { type ModelCtor, Sequelize } from 'sequelize-typescript';
import { startApplication, type StartedApplication } from './support/application';

interface ColumnRow {
  name: string;
  type: string;
  pk: number;
}

describe('the models', () => {
  let application: StartedApplication;
  let sequelize: Sequelize;
  beforeAll(async () => {
    application = await startApplication();
    sequelize = application.nest.get(Sequelize);
  });
  afterAll(() => application.stop());

  const columnsOf = (table: string): Promise<ColumnRow[]> =>
    sequelize.query<ColumnRow>('SELECT name, type, pk FROM pragma_table_info($table)', {
      bind: { table },
      type: QueryTypes.SELECT,
    });

  const fieldsOf = (model: ModelCtor): ColumnRow[] =>
    Object.values(model.getAttributes()).map((attribute) => ({
      name: attribute.field ?? '',
      type: attribute.type.toString({}),
      pk: attribute.primaryKey === true ? 1 : 0,
    }));

  it('have the columns, types and keys that the migrations made', async () => {
    const models = Object.values(sequelize.models) as ModelCtor[];
    expect(models.length).toBeGreaterThan(7);
    for (const model of models) {
      const columns = (await columnsOf(model.tableName)).map(({ name, type, pk }) => ({
        name,
        type,
        pk: pk > 0 ? 1 : 0,
      }));
      expect([model.tableName, new Set(columns)]).toEqual([model.tableName, new Set(fieldsOf(model))]);
    }
  });
});
