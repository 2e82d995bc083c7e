import { Controller, Get } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { subjectRecordsSchema, type SubjectRecords } from './record.schemas.ts';
import { RecordService } from './record.service.ts';

/** A person's own record. */
@Controller('api/record')
export class RecordController {
  constructor(private readonly record: RecordService) {}

  @Get('subjects')
  @Allow('signed-in')
  @Responds(200, subjectRecordsSchema)
  subjects(@CurrentAccount() account: SignedInAccount): Promise<SubjectRecords> {
    return this.record.subjects(account.id);
  }
}
