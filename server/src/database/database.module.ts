import { Global, Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { useAmbientTransactions } from './ambient-transaction.ts';
import { Transactions } from './transactions.ts';

useAmbientTransactions();

@Global()
@Module({
  imports: [
    SequelizeModule.forRootAsync({
      inject: [CONFIG],
      useFactory: (config: Config) => ({
        dialect: 'postgres',
        uri: config.DATABASE_URL,
        autoLoadModels: true,
        synchronize: false,
        logging: false,
        define: { underscored: true, timestamps: false },
        pool: { max: config.DATABASE_POOL, acquire: 20_000, idle: 10_000 },
        dialectOptions: {
          statement_timeout: 15_000,
          application_name: 'ferrule',
          // A receipt is a promise: what was answered is on disk, whatever the cluster's default.
          options: '-c synchronous_commit=on',
        },
        retryAttempts: 0,
      }),
    }),
  ],
  providers: [Transactions],
  exports: [Transactions],
})
export class DatabaseModule {}
