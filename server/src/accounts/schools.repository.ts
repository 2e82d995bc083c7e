import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';

@Injectable()
export class SchoolsRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** Enters the school this place is run by; one that is there stays as it is. */
  async addUnlessThere({ name, address }: { name: string; address: string }): Promise<void> {
    await this.sequelize.query(
      `INSERT INTO organisations (kind, name, address)
       SELECT 'school', $1, $2
        WHERE NOT EXISTS (SELECT 1 FROM organisations WHERE kind = 'school') RETURNING id`,
      { bind: [name, address], type: QueryTypes.SELECT },
    );
  }
}
