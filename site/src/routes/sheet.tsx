import '../features/lessons/lesson.css';
import { Button } from '@radix-ui/themes';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { thumbLabel } from '../features/course/map-words.ts';
import { courseQuery, type CourseMapView } from '../features/course/queries.ts';
import { LessonAims } from '../features/lessons/lesson-aims.tsx';
import { LessonEnd } from '../features/lessons/lesson-end.tsx';
import { LessonText } from '../features/lessons/lesson-text.tsx';
import { lessonQuery, type LessonView, progressQuery } from '../features/lessons/queries.ts';
import { useReadingProgress } from '../features/lessons/reading-progress.ts';
import { useNamedParagraph } from '../features/lessons/named-paragraph.ts';
import { RevisionNotice } from '../features/lessons/revision-notice.tsx';
import { SeatStrip } from '../features/lessons/seat-strip.tsx';
import { sayDate } from '../ui/dates.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Quantity } from '../ui/quantity.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { FootStrip, ThumbIndex } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  const number = args.params['number'] ?? '';
  const cache = cacheOf(args);
  await Promise.all([
    cache.ensureQueryData(lessonQuery(number)),
    cache.fetchQuery(progressQuery(number)),
    cache.ensureQueryData(courseQuery),
  ]);
  return null;
}

export function Component() {
  const { number = '' } = useParams();
  // A sheet of its own: nothing of the last one's state stays.
  return <LessonSheet key={number} number={number} />;
}

function LessonSheet({ number }: { number: string }) {
  const { data: lesson } = useSuspenseQuery(lessonQuery(number));
  const { data: progress } = useSuspenseQuery(progressQuery(number));
  const { data: map } = useSuspenseQuery(courseQuery);
  useReadingProgress(number, progress);
  const named = useNamedParagraph();
  return (
    <>
      <Sheet edge={<Units map={map} unit={lesson.unit.number} />}>
        <PageTitle>{`Sheet ${lesson.number}, ${lesson.title}`}</PageTitle>
        <SheetHead
          kicker={`Unit ${lesson.unit.number}, ${lesson.unit.title}`}
          title={lesson.title}
          standfirst={lesson.lead}
          titleBlock={<LessonTitleBlock lesson={lesson} map={map} />}
        />
        <RevisionNotice progress={progress} />
        <LessonAims lesson={lesson} />
        <article className="lesson" lang={lesson.language} aria-label={lesson.title}>
          <LessonText lesson={lesson} named={named} />
        </article>
        <LessonEnd lesson={lesson} />
        <SeatStrip
          lesson={lesson}
          progress={progress}
          next={(isDone) => <WhereNext lesson={lesson} map={map} isDone={isDone} />}
        />
      </Sheet>
      <FootStrip label="Neighbouring sheets" links={neighbours(lesson)} />
    </>
  );
}

function Units({ map, unit }: { map: CourseMapView; unit: number }) {
  const links = map.units.map((one) => ({
    label: thumbLabel(one),
    to: `/course#unit-${one.number}`,
    current: one.number === unit,
  }));
  return <ThumbIndex label="Units" links={links} />;
}

function LessonTitleBlock({ lesson, map }: { lesson: LessonView; map: CourseMapView }) {
  return (
    <TitleBlock
      cells={[
        { label: 'Sheet no.', value: lesson.number, kind: 'strong' },
        { label: 'Revision', value: lesson.revision },
        { label: 'Issued', value: sayDate(lesson.issued) },
        { label: 'Course', value: `${map.number}, ${map.title}`, span: 4 },
        { label: 'Reading time', value: <Quantity value={lesson.minutes} unit="min" /> },
        { label: 'Written by', value: lesson.author },
        { label: 'Checked by', value: lesson.checkedBy },
        { label: 'Next sheet', value: <NextSheet lesson={lesson} /> },
      ]}
    />
  );
}

function NextSheet({ lesson: { next } }: { lesson: LessonView }) {
  return next ? <Link to={`/sheets/${next.number}`}>{next.number}</Link> : 'the last';
}

interface WhereNextProps {
  lesson: LessonView;
  map: CourseMapView;
  isDone: boolean;
}

/** After the sheet: its worksheet, then its neighbours. */
function WhereNext({ lesson, map, isDone }: WhereNextProps) {
  const unit = map.units.find(({ number }) => number === lesson.unit.number);
  const { previous, next } = lesson;
  return (
    <>
      {unit?.worksheet && (
        <Button asChild size="3" variant={isDone ? 'solid' : 'outline'}>
          <Link to={`/worksheets/${unit.worksheet.number}`}>Worksheet {unit.worksheet.number}</Link>
        </Button>
      )}
      <span className="neighbours">
        {previous && <Link to={`/sheets/${previous.number}`}>‹ {previous.number}</Link>}
        <Link to="/course">Course map</Link>
        {next && <Link to={`/sheets/${next.number}`}>{next.number} ›</Link>}
      </span>
    </>
  );
}

function neighbours({ previous, next }: LessonView) {
  return [
    ...(previous ? [{ label: `‹ ${previous.number}`, to: `/sheets/${previous.number}` }] : []),
    { label: 'Course map', to: '/course' },
    ...(next ? [{ label: `${next.number} ›`, to: `/sheets/${next.number}` }] : []),
  ];
}
