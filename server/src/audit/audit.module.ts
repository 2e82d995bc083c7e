import { Global, Module } from '@nestjs/common';
import { SecurityEventsService } from './security-events.service.ts';

/** Every feature records what it does with accounts and certificates. */
@Global()
@Module({ providers: [SecurityEventsService], exports: [SecurityEventsService] })
export class AuditModule {}
