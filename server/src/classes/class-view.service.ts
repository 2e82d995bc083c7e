import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { NotFound } from '../problems/common.errors.ts';
import type { ClassView } from './class-view.schemas.ts';

@Injectable()
export class ClassViewService {
  async view(_account: SignedInAccount, _id: string): Promise<ClassView> {
    throw new NotFound();
  }
}
