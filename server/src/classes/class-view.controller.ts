import { Controller, Get, Param } from '@nestjs/common';
import { z } from 'zod';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { classViewSchema, type ClassView } from './class-view.schemas.ts';
import { ClassViewService } from './class-view.service.ts';

@Controller('api/classes')
export class ClassViewController {
  constructor(private readonly views: ClassViewService) {}

  @Get(':id')
  @Allow('trainer', 'administrator')
  @Responds(200, classViewSchema)
  view(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: z.uuid() }) id: string,
  ): Promise<ClassView> {
    return this.views.view(account, id);
  }
}
