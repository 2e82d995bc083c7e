import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { NotFound } from '../problems/common.errors.ts';
import type { ClassList, JoinedClass } from './classes.schemas.ts';

@Injectable()
export class ClassesService {
  async listFor(_account: SignedInAccount): Promise<ClassList> {
    throw new NotFound();
  }
  async join(_accountId: string, _joinCode: string): Promise<JoinedClass> {
    throw new NotFound();
  }
}
