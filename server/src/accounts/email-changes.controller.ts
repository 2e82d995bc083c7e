import { Body, Controller, Post } from '@nestjs/common';
import type { SignedInAccount } from './account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { CurrentSource, type RequestSource } from '../http/request-source.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import {
  acceptedSchema,
  addressNowSchema,
  changeEmailSchema,
  useTokenSchema,
  type Accepted,
  type AddressNow,
  type ChangeEmail,
  type UseToken,
} from './accounts.schemas.ts';
import { EmailChangesService } from './email-changes.service.ts';
import { EmailMovesService } from './email-moves.service.ts';

@Controller('api')
export class EmailChangesController {
  constructor(
    private readonly changes: EmailChangesService,
    private readonly moves: EmailMovesService,
  ) {}

  @Post('me/email-changes')
  @Allow('signed-in')
  @Responds(202, acceptedSchema)
  ask(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: changeEmailSchema }) input: ChangeEmail,
    @CurrentSource() source: RequestSource,
  ): Promise<Accepted> {
    return this.changes.ask(account, input, source);
  }

  @Post('email-changes/confirmations')
  @Allow('anyone')
  @Responds(200, addressNowSchema)
  confirm(
    @Body({ schema: useTokenSchema }) { token }: UseToken,
    @CurrentSource() source: RequestSource,
  ): Promise<AddressNow> {
    return this.moves.confirm(token, source);
  }

  @Post('email-changes/undo')
  @Allow('anyone')
  @Responds(200, addressNowSchema)
  undo(
    @Body({ schema: useTokenSchema }) { token }: UseToken,
    @CurrentSource() source: RequestSource,
  ): Promise<AddressNow> {
    return this.moves.undo(token, source);
  }
}
