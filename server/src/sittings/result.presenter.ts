import type { CertificateOfSitting } from '../certificates/certificate.ts';
import { localDay } from '../clock/local-day.ts';
import type { Practice } from '../papers/paper.ts';
import type { Result } from './result.ts';
import { percentOf, type Sitting } from './sitting.ts';
import { candidateName } from './sitting.presenter.ts';
import type { ResultView } from './sittings.schemas.ts';

interface Around {
  readonly practice: ReadonlyMap<string, Practice>;
  readonly certificate: CertificateOfSitting | null;
}

export function presentResult(sitting: Sitting, result: Result, around: Around): ResultView {
  const { rules } = sitting;
  const { slug, number, title } = rules.paper;
  const { marks, outOf, passed } = result;
  return {
    id: sitting.id,
    paper: { slug, number, title },
    name: candidateName(sitting),
    satOn: localDay(sitting.startedAt, rules.scheme.zone),
    handedInHow: sitting.handedInHow ?? 'at-the-deadline',
    markedAt: result.markedAt.toISOString(),
    ...{ marks, outOf, passed },
    percent: percentOf(marks, outOf),
    passPercent: rules.passPercent,
    passMarks: rules.passMarks,
    bySubject: result.bySubject.map(({ practise, ...subject }) => ({
      ...subject,
      practise: practise === null ? null : (around.practice.get(practise) ?? null),
    })),
    maySitAgainAt: result.maySitAgainAt?.toISOString() ?? null,
    appeal: rules.appeal,
    certificate: around.certificate,
  };
}
