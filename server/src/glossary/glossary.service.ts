import { Injectable } from '@nestjs/common';
import type { CompiledLesson } from '../publishing/compiled-lesson.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import type { GlossaryView } from './glossary.schemas.ts';
import { gatherTerms, termAnchor, termsIn, type Term } from './terms.ts';

@Injectable()
export class GlossaryService {
  constructor(private readonly content: PublishedContentService) {}

  async glossary(): Promise<GlossaryView> {
    const { glossaries, lessons, terms } = await this.gathered();
    const titles = new Map(lessons.map(({ number, title }) => [number, title]));
    const [glossary] = glossaries;
    return {
      language: glossary?.language ?? 'en',
      revision: glossary?.revision ?? null,
      terms: terms.map(({ term, means, also, sheets }) => ({
        ...{ term, anchor: termAnchor(term), means, also: [...also] },
        sheets: sheets.flatMap((number) => {
          const title = titles.get(number);
          return title === undefined ? [] : [{ number, title }];
        }),
      })),
    };
  }

  /** The terms that one lesson uses. */
  async termsOf(lesson: CompiledLesson): Promise<Term[]> {
    return termsIn(lesson, (await this.gathered()).terms);
  }

  private async gathered() {
    const [courses, glossaries, lessons] = await Promise.all([
      this.content.all('course'),
      this.content.all('glossary'),
      this.content.all('lesson'),
    ]);
    const byNumber = new Map(lessons.map(({ content }) => [content.number, content]));
    const issued = courses
      .flatMap(({ content }) => content.units.flatMap(({ sheets }) => sheets))
      .flatMap((number) => byNumber.get(number) ?? []);
    const published = glossaries.map(({ content }) => content);
    return { glossaries: published, lessons: issued, terms: gatherTerms(published, issued) };
  }
}
