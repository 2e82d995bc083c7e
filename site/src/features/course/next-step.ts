import { type CourseMapView } from './queries.ts';

/** The one thing to do next, for the one solid button of the map. */
export interface NextStep {
  label: string;
  to: string;
  detail: string;
  /** Set beside the detail with its unit. */
  minutes?: number;
}

/** A running paper first, then the reading, then the worksheets, then the paper. */
export function nextStep(map: CourseMapView): NextStep | null {
  return goOnSitting(map) ?? carryOn(map) ?? workNext(map) ?? paperOrCertificate(map);
}

function goOnSitting({ paper }: CourseMapView): NextStep | null {
  if (paper?.state !== 'sitting' || !paper.sittingId) return null;
  return {
    label: 'Go on with the paper',
    to: `/sittings/${paper.sittingId}`,
    detail: 'The clock is running.',
  };
}

function carryOn({ carryOn: sheet }: CourseMapView): NextStep | null {
  if (!sheet) return null;
  const isBegun = sheet.paragraph > 1;
  const where = isBegun ? `, paragraph ${sheet.paragraph} of ${sheet.of}` : '';
  return {
    label: isBegun ? `Carry on with ${sheet.sheet}` : `Begin sheet ${sheet.sheet}`,
    to: `/sheets/${sheet.sheet}${isBegun ? `#p${sheet.paragraph}` : ''}`,
    detail: `${sheet.title}${where}.`,
    minutes: sheet.minutesLeft,
  };
}

function workNext({ units }: CourseMapView): NextStep | null {
  const worksheet = units
    .flatMap((unit) => unit.worksheet ?? [])
    .find(({ lit, openAttemptId }) => openAttemptId !== null || !lit);
  if (!worksheet) return null;
  return {
    label: `Worksheet ${worksheet.number}`,
    to: worksheet.openAttemptId
      ? `/worksheet-attempts/${worksheet.openAttemptId}`
      : `/worksheets/${worksheet.number}`,
    detail: `${worksheet.title}. Every sheet is read; this lamp is not lit yet.`,
  };
}

function paperOrCertificate({ paper }: CourseMapView): NextStep | null {
  if (paper?.state === 'passed') {
    return { label: 'My record', to: '/record', detail: `${paper.title} passed.` };
  }
  if (paper?.state !== 'open') return null;
  return {
    label: 'Sit the paper',
    to: `/papers/${paper.slug}`,
    detail: `${paper.title}. Every lamp is lit.`,
  };
}
