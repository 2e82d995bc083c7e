import { Inject, Injectable, type BeforeApplicationShutdown } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import { readdir, statfs } from 'node:fs/promises';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { pendingMigrations } from '../database/migrator.ts';

const LEAST_FREE_BYTES = 200_000_000;

@Injectable()
export class HealthService implements BeforeApplicationShutdown {
  private isStopping = false;

  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  beforeApplicationShutdown(): void {
    this.isStopping = true;
  }

  /** What keeps this server from serving, in words; empty when it is ready. */
  async missing(): Promise<string[]> {
    if (this.isStopping) return ['The server is stopping.'];
    const checks = [this.database(), this.keys(), this.disk()];
    return (await Promise.all(checks)).filter((line) => line !== null);
  }

  private async database(): Promise<string | null> {
    try {
      const rows = await this.sequelize.query<{ name: string }>(
        'SELECT name FROM schema_migrations',
        {
          type: QueryTypes.SELECT,
        },
      );
      const pending = pendingMigrations(rows.map(({ name }) => name));
      return pending.length === 0 ? null : `The database waits for ${pending.join(', ')}.`;
    } catch {
      return 'The database does not answer.';
    }
  }

  private async keys(): Promise<string | null> {
    try {
      const files = await readdir(this.config.KEYS_FOLDER);
      return files.length > 0 ? null : 'There is no signing key.';
    } catch {
      return 'The folder of the signing keys cannot be read.';
    }
  }

  private async disk(): Promise<string | null> {
    const space = await statfs(this.config.KEYS_FOLDER).catch(() => null);
    if (!space) return null;
    const freeBytes = space.bavail * space.bsize;
    return freeBytes > LEAST_FREE_BYTES ? null : 'The disk is nearly full.';
  }
}
