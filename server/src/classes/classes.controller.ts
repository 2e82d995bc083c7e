import { Body, Controller, Get, Post } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import {
  classListSchema,
  joinClassSchema,
  joinedClassSchema,
  openClassSchema,
  openedClassSchema,
  type ClassList,
  type JoinClass,
  type JoinedClass,
  type OpenClass,
  type OpenedClass,
} from './classes.schemas.ts';
import { ClassesService } from './classes.service.ts';
import { OpeningService } from './opening.service.ts';

@Controller('api')
export class ClassesController {
  constructor(
    private readonly classes: ClassesService,
    private readonly opening: OpeningService,
  ) {}

  @Get('classes')
  @Allow('signed-in')
  @Responds(200, classListSchema)
  list(@CurrentAccount() account: SignedInAccount): Promise<ClassList> {
    return this.classes.listFor(account);
  }

  @Post('classes')
  @Allow('administrator')
  @Responds(201, openedClassSchema)
  open(@Body({ schema: openClassSchema }) input: OpenClass): Promise<OpenedClass> {
    return this.opening.open(input);
  }

  @Post('class-memberships')
  @Allow('signed-in')
  @Responds(201, joinedClassSchema)
  join(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: joinClassSchema }) input: JoinClass,
  ): Promise<JoinedClass> {
    return this.classes.join(account.id, input.joinCode);
  }
}
