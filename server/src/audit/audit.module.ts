import { Global, Module } from '@nestjs/common';
import { SecurityEventsRepository } from './security-events.repository.ts';
import { SecurityEventsService } from './security-events.service.ts';

/** Every feature records what it does with accounts and certificates. */
@Global()
@Module({
  providers: [SecurityEventsRepository, SecurityEventsService],
  exports: [SecurityEventsService],
})
export class AuditModule {}
