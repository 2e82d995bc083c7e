import { Body, Controller, Get, Put } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { CurrentSource, type RequestSource } from '../http/request-source.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { practiceProfileSchema, type PracticeProfileView } from './school.schemas.ts';
import { SchoolService } from './school.service.ts';

@Controller('api/school')
export class SchoolController {
  constructor(private readonly school: SchoolService) {}

  @Get('practice-profile')
  @Allow('administrator')
  @Responds(200, practiceProfileSchema)
  async profile(): Promise<PracticeProfileView> {
    return { profile: await this.school.profile() };
  }

  @Put('practice-profile')
  @Allow('administrator')
  @Responds(200, practiceProfileSchema)
  async choose(
    @CurrentAccount() { id }: SignedInAccount,
    @CurrentSource() { address }: RequestSource,
    @Body({ schema: practiceProfileSchema }) { profile }: PracticeProfileView,
  ): Promise<PracticeProfileView> {
    return { profile: await this.school.choose({ id, address }, profile) };
  }
}
