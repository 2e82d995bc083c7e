import { afterAll, beforeAll, expect, it } from '@jest/globals';
import { getConnectionToken } from '@nestjs/sequelize';
import type { Sequelize } from 'sequelize';
import { createTestApp, type TestApp } from '../../test/test-app.ts';

let test: TestApp;
beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());

it('has a column for every attribute of every model', async () => {
  const sequelize = test.app.get<Sequelize>(getConnectionToken());
  const models = Object.values(sequelize.models);
  expect(models.length).toBeGreaterThan(2);
  for (const model of models) {
    const columns = await sequelize.getQueryInterface().describeTable(model.getTableName());
    const fields = Object.values(model.getAttributes()).map(({ field }) => field ?? '');
    expect({ table: model.getTableName(), missing: fields.filter((f) => !(f in columns)) }).toEqual(
      {
        table: model.getTableName(),
        missing: [],
      },
    );
  }
});
