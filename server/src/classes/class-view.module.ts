import { Module } from '@nestjs/common';
import { ClassViewController } from './class-view.controller.ts';
import { ClassViewService } from './class-view.service.ts';

@Module({ controllers: [ClassViewController], providers: [ClassViewService] })
export class ClassViewModule {}
