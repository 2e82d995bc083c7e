import { questionCount, type Paper } from '../papers/paper.ts';
import type { PaperView, StandingView } from './papers.schemas.ts';
import { minutesAllowed } from './sitting.ts';
import type { Standing } from './standing.ts';

export function presentStanding(standing: Standing): StandingView {
  const { state, reasons, mayStartAt, sittingId, certificateId, sittings } = standing;
  return {
    ...{ state, sittingId, certificateId },
    reasons: [...reasons],
    mayStartAt: mayStartAt?.toISOString() ?? null,
    sittings: sittings.map(({ id, startedAt, handedInAt, passed }) => ({
      ...{ id, passed },
      startedAt: startedAt.toISOString(),
      handedInAt: handedInAt?.toISOString() ?? null,
    })),
  };
}

interface ForOnePerson {
  readonly standing: Standing;
  readonly marks: number | null;
  readonly extraTimePercent: number;
}

/** What a candidate is told beforehand. */
export function presentPaper(paper: Paper, person: ForOnePerson): PaperView {
  const { blueprint, agreementHash } = paper;
  const { slug, number, title, passPercent, waitDays, sat, aids, agreement, appeal } = blueprint;
  const { title: schemeTitle, revision, scope, limits, validYears } = blueprint.scheme;
  return {
    ...{ slug, number, title, passPercent, waitDays, sat, aids, agreement, appeal, agreementHash },
    minutes: minutesAllowed(blueprint.minutes, person.extraTimePercent),
    extraTimePercent: person.extraTimePercent,
    questions: questionCount(blueprint),
    marks: person.marks,
    scheme: { title: schemeTitle, revision, scope, limits, validYears },
    standing: presentStanding(person.standing),
  };
}
