import { Module } from '@nestjs/common';
import { ThrottlesRepository } from './throttles.repository.ts';
import { ThrottlesService } from './throttles.service.ts';

@Module({ providers: [ThrottlesRepository, ThrottlesService], exports: [ThrottlesService] })
export class ThrottlesModule {}
