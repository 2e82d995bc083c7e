import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import type { HandedIn, SaveAnswer, Saved, SittingView, StartSitting } from './sittings.schemas.ts';

@Injectable()
export class SittingsService {
  async start(_account: SignedInAccount, _input: StartSitting): Promise<SittingView> {
    throw new Error('not built');
  }
  async view(_account: SignedInAccount, _id: string): Promise<SittingView> {
    throw new Error('not built');
  }
  async save(
    _account: SignedInAccount,
    _place: { id: string; key: string; part: string },
    _input: SaveAnswer,
  ): Promise<Saved> {
    throw new Error('not built');
  }
  async comeBack(
    _account: SignedInAccount,
    _place: { id: string; key: string },
    _comeBack: boolean,
  ): Promise<{ comeBack: boolean }> {
    throw new Error('not built');
  }
  async takeOver(_account: SignedInAccount, _id: string): Promise<SittingView> {
    throw new Error('not built');
  }
  async handIn(_account: SignedInAccount, _id: string): Promise<HandedIn> {
    throw new Error('not built');
  }
}
