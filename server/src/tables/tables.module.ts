import { Module } from '@nestjs/common';
import { TablesController } from './tables.controller.ts';

@Module({ controllers: [TablesController] })
export class TablesModule {}
