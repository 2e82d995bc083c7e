import { jest } from '@jest/globals';
import { getConnectionToken } from '@nestjs/sequelize';
import type { Sequelize } from 'sequelize';
import type { TestApp } from './test-app.ts';

/** How many statements the work sends to the database. */
export async function countQueries(test: TestApp, work: () => Promise<unknown>): Promise<number> {
  const sequelize = test.app.get<Sequelize>(getConnectionToken());
  const spy = jest.spyOn(sequelize, 'query');
  await work();
  const count = spy.mock.calls.length;
  spy.mockRestore();
  return count;
}
