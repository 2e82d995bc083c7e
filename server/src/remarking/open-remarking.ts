import { Sequelize } from 'sequelize';
import { RemarkingRepository } from './remarking.repository.ts';
import { RemarkingService } from './remarking.service.ts';

/** Marking again on a connection that cannot write, apart from the running server. */
export function openRemarking(databaseUrl: string): {
  remarking: RemarkingService;
  close: () => Promise<void>;
} {
  const sequelize = new Sequelize(databaseUrl, {
    dialect: 'postgres',
    logging: false,
    dialectOptions: {
      application_name: 'ferrule-remark',
      options: '-c default_transaction_read_only=on',
    },
  });
  const remarking = new RemarkingService(new RemarkingRepository(sequelize));
  return { remarking, close: () => sequelize.close() };
}
