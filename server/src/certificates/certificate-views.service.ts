import { foldName } from '@ferrule/certificates';
import { Inject, Injectable } from '@nestjs/common';
import { z } from 'zod';
import type { SignedInAccount } from '../accounts/account.ts';
import { Clock } from '../clock/clock.ts';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { InvalidRequest, NotFound } from '../problems/common.errors.ts';
import { CertificateFilesRepository } from './certificate-files.repository.ts';
import {
  CertificateRecordsRepository,
  type CertificatePlace,
} from './certificate-records.repository.ts';
import { presentCertificate } from './certificate.presenter.ts';
import type { CertificateRecord } from './certificate.ts';
import { CertificateNotDrawn } from './certificates.errors.ts';
import type {
  CertificatesPage,
  CertificateView,
  FindCertificates,
  OwnCertificates,
} from './certificates.schemas.ts';

const PAGE = 50;
const placeSchema = z.tuple([z.iso.datetime(), z.uuid()]);

/** Shows certificates to their holders and to the desk. */
@Injectable()
export class CertificateViewsService {
  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly records: CertificateRecordsRepository,
    private readonly files: CertificateFilesRepository,
    private readonly clock: Clock,
  ) {}

  async ofAccount(accountId: string): Promise<OwnCertificates> {
    const records = await this.records.ofAccount(accountId, this.clock.now());
    return { certificates: await this.present(records) };
  }

  async find(viewer: SignedInAccount, id: string): Promise<CertificateView> {
    const record = await this.visible(viewer, id);
    const [view] = await this.present([record]);
    if (!view) throw new NotFound();
    return view;
  }

  async page({ find, cursor }: FindCertificates): Promise<CertificatesPage> {
    const after = cursor === '' ? null : readCursor(cursor);
    const wanted = { ...foldFind(find), after, most: PAGE + 1 };
    const records = await this.records.page(wanted, this.clock.now());
    const shown = records.slice(0, PAGE);
    const last = shown.at(-1);
    return {
      certificates: await this.present(shown),
      nextCursor: last && records.length > PAGE ? writeCursor(last) : null,
    };
  }

  /** @throws {NotFound | CertificateNotDrawn} */
  async file(viewer: SignedInAccount, id: string): Promise<{ number: string; pdf: Buffer }> {
    const { number } = await this.visible(viewer, id);
    const pdf = await this.files.find(id);
    if (!pdf) throw new CertificateNotDrawn();
    return { number, pdf };
  }

  private async visible(viewer: SignedInAccount, id: string): Promise<CertificateRecord> {
    const record = await this.records.findById(id, this.clock.now());
    if (!record || !(record.accountId === viewer.id || isAtDesk(viewer))) throw new NotFound();
    return record;
  }

  private async present(records: readonly CertificateRecord[]): Promise<CertificateView[]> {
    const events = await this.records.eventsOf(records.map(({ id }) => id));
    return records.map((record) => presentCertificate(record, events, this.config.PUBLIC_URL));
  }
}

/** An administrator is one only with the second factor given. */
function isAtDesk({ roles, secondFactorAt }: SignedInAccount): boolean {
  if (roles.includes('certification-manager')) return true;
  return roles.includes('administrator') && secondFactorAt !== null;
}

/** What was typed to find: as a name, and as a part of a number where it can be one. */
function foldFind(find: string) {
  const compact = find.toUpperCase().replaceAll(/[\s\p{Pd}]/gu, '');
  return {
    namePart: find.normalize('NFC'),
    nameFold: foldName(find),
    numberPart: /^[A-Z0-9]+$/.test(compact) ? compact : '',
  };
}

const writeCursor = ({ issuedAt, id }: CertificatePlace) =>
  Buffer.from(JSON.stringify([issuedAt.toISOString(), id])).toString('base64url');

function readCursor(cursor: string): CertificatePlace {
  try {
    const parsed: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
    const [issuedAt, id] = placeSchema.parse(parsed);
    return { issuedAt: new Date(issuedAt), id };
  } catch {
    const detail = 'This is no place in the list; leave it out to begin at the top.';
    throw new InvalidRequest([{ pointer: '#/cursor', detail }]);
  }
}
