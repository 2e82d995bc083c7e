import { NestFactory } from '@nestjs/core';
import { getConnectionToken } from '@nestjs/sequelize';
import type { Sequelize } from 'sequelize';
import { AppModule } from '../app.module.ts';
import type { Config } from '../config/config.schema.ts';
import { HistoryPlayer } from './history-player.ts';
import { history } from './history.ts';
import { SchoolBooks } from './school.ts';
import { TravellingClock } from './travelling-clock.ts';

/**
 * Fills an empty database with the demonstration school and its past, once.
 *
 * @returns whether anything was done.
 */
export async function seedDemonstration(
  config: Config,
  passphrases: Record<string, string>,
): Promise<boolean> {
  const clock = new TravellingClock();
  const app = await NestFactory.createApplicationContext(
    AppModule.with({ ...config, JOB_WORKERS: '0' }, clock),
    { logger: ['error', 'warn'], abortOnError: false },
  );
  try {
    const books = new SchoolBooks(app.get<Sequelize>(getConnectionToken(), { strict: false }));
    if (await books.isFilled()) return false;
    await books.enterPeople(passphrases);
    await books.openSchool();
    const player = new HistoryPlayer(app, clock);
    for (const happening of history) await player.play(happening);
    await books.noteFilled();
    return true;
  } finally {
    await app.close();
  }
}
