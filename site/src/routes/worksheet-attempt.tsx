import '../features/worksheets/worksheets.css';
import '../features/worksheets/earlier-sheets.css';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { Link, useParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { thumbLabel } from '../features/course/map-words.ts';
import { courseQuery } from '../features/course/queries.ts';
import { AnswerSheet } from '../features/worksheets/answer-sheet.tsx';
import { MarkedSheet } from '../features/worksheets/marked-sheet.tsx';
import { attemptQuery, type WorksheetView } from '../features/worksheets/queries.ts';
import { ReadOnlySheet } from '../features/worksheets/read-only-sheet.tsx';
import { sayResult } from '../features/worksheets/say-result.ts';
import { StartAttempt } from '../features/worksheets/start-attempt.tsx';
import { sayDate } from '../ui/dates.ts';
import { focusOnHeading } from '../ui/focus-on-heading.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { FootStrip, ThumbIndex } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  const cache = cacheOf(args);
  const attempt = await cache.fetchQuery(attemptQuery(args.params['id'] ?? ''));
  if (attempt.mine) await cache.ensureQueryData(courseQuery);
  return null;
}

export function Component() {
  const { id = '' } = useParams();
  return <Attempt key={id} id={id} />;
}

function Attempt({ id }: { id: string }) {
  const { data: attempt } = useSuspenseQuery(attemptQuery(id));
  const isMarked = attempt.handedInAt !== null;
  const wasJustMarked = useFocusWhenMarked(isMarked);
  return (
    <>
      <Sheet
        className={wasJustMarked ? 'just-marked' : ''}
        edge={attempt.mine && <Units unit={attempt.unit.number} />}
      >
        <PageTitle>{`Worksheet ${attempt.number}, ${attempt.title}`}</PageTitle>
        <SheetHead
          kicker={isMarked ? 'Worksheet, marked' : 'Worksheet, practice'}
          title={attempt.title}
          standfirst={
            isMarked
              ? sayResult(attempt)
              : 'Answers save as you go. Nothing is marked before you hand in.'
          }
          titleBlock={<AttemptTitleBlock attempt={attempt} />}
        >
          {isMarked && <AfterMarking attempt={attempt} />}
        </SheetHead>
        <Body attempt={attempt} />
      </Sheet>
      {attempt.mine && <FootStrip label="Worksheet" links={footLinks(attempt)} />}
    </>
  );
}

function Body({ attempt }: { attempt: WorksheetView }) {
  if (attempt.handedInAt) return <MarkedSheet attempt={attempt} />;
  return attempt.mine ? <AnswerSheet attempt={attempt} /> : <ReadOnlySheet attempt={attempt} />;
}

/** Handing in turns the page over: it is read again from its heading. */
function useFocusWhenMarked(isMarked: boolean): boolean {
  const [wasOpen] = useState(!isMarked);
  useEffect(() => {
    if (!isMarked || !wasOpen) return;
    focusOnHeading();
    window.scrollTo(0, 0);
  }, [isMarked, wasOpen]);
  return isMarked && wasOpen;
}

function Units({ unit }: { unit: number }) {
  const { data: map } = useSuspenseQuery(courseQuery);
  const links = map.units.map((one) => ({
    label: thumbLabel(one),
    to: `/course#unit-${one.number}`,
    current: one.number === unit,
  }));
  return <ThumbIndex label="Units" links={links} />;
}

function AttemptTitleBlock({ attempt }: { attempt: WorksheetView }) {
  const { trainee, handedInAt } = attempt;
  return (
    <TitleBlock
      cells={[
        { label: 'Worksheet no.', value: attempt.number, kind: 'strong' },
        { label: 'Variant', value: <span className="mono">{attempt.variant}</span> },
        handedInAt
          ? { label: 'Mark', value: <Mark attempt={attempt} />, kind: 'scored' }
          : { label: 'Marks', value: attempt.outOf, kind: 'strong' },
        { label: 'Subject', value: attempt.unit.title, span: 4 },
        { label: 'Attempt', value: attempt.attempt },
        { label: 'Trainee', value: `${trainee.givenName} ${trainee.familyName}` },
        {
          label: handedInAt ? 'Marked' : 'Opened',
          value: sayDate(handedInAt ?? attempt.startedAt),
        },
        { label: 'Set by', value: attempt.setBy },
      ]}
    />
  );
}

function Mark({ attempt }: { attempt: WorksheetView }) {
  return (
    <span className="sheet-mark">
      {attempt.marks} <small>of {attempt.outOf}</small>
    </span>
  );
}

function AfterMarking({ attempt }: { attempt: WorksheetView }) {
  if (!attempt.mine) {
    return (
      <div className="actions">
        <Link to="/classes">To the classes</Link>
      </div>
    );
  }
  return (
    <StartAttempt number={attempt.number} label="Work it again with fresh figures">
      <Link to={`/worksheets/${attempt.number}`}>All attempts</Link>
      <Link to={`/course#unit-${attempt.unit.number}`}>Course map</Link>
    </StartAttempt>
  );
}

function footLinks({ number }: WorksheetView) {
  return [
    { label: 'Course map', to: '/course' },
    { label: `Attempts ${number}`, to: `/worksheets/${number}` },
    { label: 'My record', to: '/record' },
  ];
}
