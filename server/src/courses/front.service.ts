import { Inject, Injectable } from '@nestjs/common';
import { ClassesService } from '../classes/classes.service.ts';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import {
  demonstrationClass,
  demonstrationPeople,
  roleNames,
  type SeededPerson,
} from '../seed/people.ts';
import type { Front } from './courses.schemas.ts';

/** What anyone sees before signing in. */
@Injectable()
export class FrontService {
  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly classes: ClassesService,
    private readonly content: PublishedContentService,
    private readonly questions: QuestionsService,
  ) {}

  async front(): Promise<Front> {
    const [school, course] = await Promise.all([this.classes.schoolOf(null), this.course()]);
    const isDemonstration = this.config.DEMONSTRATION === '1';
    return {
      demonstration: isDemonstration,
      school: school ?? { name: course?.owner ?? '', address: '' },
      course: course?.facts ?? null,
      people: isDemonstration ? demonstrationPeople.map(introduce) : [],
      joinCode: isDemonstration ? demonstrationClass.joinCode : null,
    };
  }

  private async course(): Promise<{ owner: string; facts: Front['course'] } | null> {
    const [courses, lessons, questions] = await Promise.all([
      this.content.all('course'),
      this.content.all('lesson'),
      this.questions.countPractice(),
    ]);
    const [course] = courses;
    if (!course) return null;
    const { number, title, owner, units } = course.content;
    const issued = new Set(units.flatMap(({ sheets }) => sheets));
    const sheets = lessons.filter(({ content }) => issued.has(content.number));
    const minutesToRead = sheets.reduce((sum, { content }) => sum + content.minutes, 0);
    const counts = { sheets: sheets.length, units: units.length, questions, minutesToRead };
    return { owner, facts: { number, title, ...counts } };
  }
}

const introduce = ({ roles, givenName, familyName, email }: SeededPerson) => ({
  role: roles.map((role) => roleNames[role]).join(', '),
  name: `${givenName} ${familyName}`,
  email,
});
