import { type QuestionAudit } from './audit-question.ts';
import { type PartAudit } from './part-tally.ts';

/** Bounds every question keeps. */
const AUDIT_BOUNDS = {
  mostRejected: 1 / 3,
  /** From key to slip, in tolerances: nearer ones could be taken for each other. */
  nearestSlip: 2,
  /** A slip that is silent in most draws teaches nobody. */
  leastLive: 0.25,
  /** With fewer different papers neighbours share their answers. */
  leastPapers: 12,
  /** An answer that is often printed as a given can be copied; a size may well be the one fitted. */
  mostAsGiven: { figure: 0.25, size: 0.5 },
  mostMsPerDraw: { plain: 2, curve: 20 },
} as const;

/** One figure of an audit that is out of bounds. */
export interface Breach {
  slug: string;
  figure: string;
  value: string;
  bound: string;
  remedy: string;
}

type Rule = (audit: QuestionAudit) => Omit<Breach, 'slug'>[];

/** What is out of bounds, each with its remedy; nothing when the question is sound. */
export function breachesOf(audit: QuestionAudit): Breach[] {
  return RULES.flatMap((rule) => rule(audit)).map((breach) => ({ slug: audit.slug, ...breach }));
}

const percent = (share: number): string => `${(share * 100).toFixed(1)} %`;

const RULES: readonly Rule[] = [
  ({ failures, draws }) =>
    failures.count === 0
      ? []
      : [
          {
            figure: 'draws that fail',
            value: `${failures.count} of ${draws} (${failures.first})`,
            bound: 'none',
            remedy: 'narrow the givens or add a condition',
          },
        ],
  ({ rejectedShare }) =>
    rejectedShare <= AUDIT_BOUNDS.mostRejected
      ? []
      : [
          {
            figure: 'rejected draws',
            value: percent(rejectedShare),
            bound: `at most ${percent(AUDIT_BOUNDS.mostRejected)}`,
            remedy: 'narrow the givens to what the conditions allow',
          },
        ],
  ({ parts }) => parts.flatMap(rangeBreaches),
  ({ parts }) => parts.flatMap(nearnessBreaches),
  ({ parts }) => parts.flatMap(givenBreaches),
  ({ slips }) => slips.flatMap(livenessBreaches),
  ({ hasDrawnFigures, papers, draws }) =>
    !hasDrawnFigures || papers >= Math.min(AUDIT_BOUNDS.leastPapers, draws)
      ? []
      : [
          {
            figure: 'different papers',
            value: String(papers),
            bound: `at least ${AUDIT_BOUNDS.leastPapers}`,
            remedy: 'widen a range or draw another given',
          },
        ],
  timeBreaches,
];

function rangeBreaches({ id, range, unit }: PartAudit): Omit<Breach, 'slug'>[] {
  if (!range || (Number.isFinite(range.least) && Number.isFinite(range.most))) return [];
  return [
    {
      figure: `answers to (${id})`,
      value: `${range.least} to ${range.most} ${unit}`,
      bound: 'finite',
      remedy: 'keep the givens from dividing by nought',
    },
  ];
}

function nearnessBreaches({ id, nearestSlip }: PartAudit): Omit<Breach, 'slug'>[] {
  if (nearestSlip === null || nearestSlip >= AUDIT_BOUNDS.nearestSlip) return [];
  return [
    {
      figure: `nearest slip in (${id})`,
      value: `${nearestSlip.toFixed(2)} tolerances`,
      bound: `at least ${AUDIT_BOUNDS.nearestSlip}`,
      remedy: 'narrow the tolerance, or the givens that bring slip and key together',
    },
  ];
}

function givenBreaches({ id, kind, givenShare }: PartAudit): Omit<Breach, 'slug'>[] {
  const most = AUDIT_BOUNDS.mostAsGiven[kind === 'size' ? 'size' : 'figure'];
  if (givenShare <= most) return [];
  return [
    {
      figure: `answers to (${id}) that are a given`,
      value: percent(givenShare),
      bound: `at most ${percent(most)}`,
      remedy: 'ask for something that has to be worked out, or change a range',
    },
  ];
}

function livenessBreaches({
  is,
  liveShare,
}: QuestionAudit['slips'][number]): Omit<Breach, 'slug'>[] {
  if (liveShare >= AUDIT_BOUNDS.leastLive) return [];
  return [
    {
      figure: `draws in which “${is}” can be told`,
      value: percent(liveShare),
      bound: `at least ${percent(AUDIT_BOUNDS.leastLive)}`,
      remedy: 'widen the givens, narrow the tolerance, or drop the slip',
    },
  ];
}

function timeBreaches({ readsCurve, msPerDraw }: QuestionAudit): Omit<Breach, 'slug'>[] {
  const most = AUDIT_BOUNDS.mostMsPerDraw[readsCurve ? 'curve' : 'plain'];
  if (msPerDraw <= most) return [];
  return [
    {
      figure: 'time for a draw',
      value: `${msPerDraw.toFixed(2)} ms`,
      bound: `at most ${most} ms`,
      remedy: 'lengthen a curve’s step or simplify its conditions',
    },
  ];
}
