import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Clock } from '../clock/clock.ts';
import { InvalidRequest, NotFound } from '../problems/common.errors.ts';
import { tellEvent } from './event-words.ts';
import type { FindPeople, PeoplePage, PersonPage } from './people.schemas.ts';
import { PeopleRepository } from './people.repository.ts';
import { readCursor, writeCursor, type PeopleCursor } from './person.ts';
import { presentPerson } from './person.presenter.ts';

const PAGE_SIZE = 50;
const LATELY = 20;

/** Looking people up. */
@Injectable()
export class PeopleService {
  constructor(
    private readonly repository: PeopleRepository,
    private readonly events: SecurityEventsService,
    private readonly clock: Clock,
  ) {}

  async find({ find, cursor }: FindPeople): Promise<PeoplePage> {
    const after = cursor === '' ? null : cursorFrom(cursor);
    const wanted = { find, after, most: PAGE_SIZE + 1 };
    const found = await this.repository.page(wanted, this.clock.now());
    const people = found.slice(0, PAGE_SIZE);
    const last = people.at(-1);
    return {
      people: people.map(presentPerson),
      nextCursor: last && found.length > PAGE_SIZE ? writeCursor(last) : null,
    };
  }

  async get(id: string): Promise<PersonPage> {
    const person = await this.repository.find(id, this.clock.now());
    if (!person) throw new NotFound('There is nobody under this address.');
    const lately = await this.events.latelyOf(id, LATELY);
    return {
      person: presentPerson(person),
      lately: lately.map((event) => ({ at: event.at.toISOString(), what: tellEvent(event) })),
    };
  }
}

function cursorFrom(text: string): PeopleCursor {
  const cursor = readCursor(text);
  if (!cursor) {
    throw new InvalidRequest([
      { pointer: '#/cursor', detail: 'This is not the end of a page; begin at the first page.' },
    ]);
  }
  return cursor;
}
