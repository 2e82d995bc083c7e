import { Injectable } from '@nestjs/common';
import { z } from 'zod';
import { InvalidRequest } from '../problems/common.errors.ts';
import type { ResultsPage } from './papers.schemas.ts';
import { ResultsRepository, type ListedSitting, type Place } from './results.repository.ts';
import { percentOf } from './sitting.ts';

const PAGE = 50;

const placeSchema = z.tuple([z.iso.datetime(), z.uuid()]);

const writeCursor = ({ startedAt, id }: Place) =>
  Buffer.from(JSON.stringify([startedAt.toISOString(), id])).toString('base64url');

function readCursor(cursor: string): Place {
  try {
    const parsed: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
    const [startedAt, id] = placeSchema.parse(parsed);
    return { startedAt: new Date(startedAt), id };
  } catch {
    const detail = 'This is no place in the list; leave it out to begin at the top.';
    throw new InvalidRequest([{ pointer: '#/cursor', detail }]);
  }
}

function present(row: ListedSitting): ResultsPage['results'][number] {
  const { id, name, satOn, handedInHow, marks, outOf, passed, looks } = row;
  const percent = marks === null || outOf === null ? null : percentOf(marks, outOf);
  return { id, name, satOn, handedInHow, percent, passed, looks };
}

/** The papers handed in, for certification managers. */
@Injectable()
export class ResultsListService {
  constructor(private readonly results: ResultsRepository) {}

  async list(paperSlug: string, cursor: string | null): Promise<ResultsPage> {
    const after = cursor === null ? null : readCursor(cursor);
    const rows = await this.results.list(paperSlug, after, PAGE + 1);
    const shown = rows.slice(0, PAGE);
    const last = shown.at(-1);
    return {
      results: shown.map(present),
      nextCursor: rows.length > PAGE && last ? writeCursor(last) : null,
    };
  }
}
