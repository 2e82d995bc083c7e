import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { SchemeModel } from './models/scheme.model.ts';

@Injectable()
export class PapersRepository {
  constructor(@InjectModel(SchemeModel) private readonly schemes: typeof SchemeModel) {}

  async findScheme(slug: string, revision: string): Promise<string | null> {
    const row = await this.schemes.findOne({ attributes: ['id'], where: { slug, revision } });
    return row?.id ?? null;
  }
}
