import '../features/course/course.css';
import { Button } from '@radix-ui/themes';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession, sessionQuery } from '../api/session.ts';
import { CourseDiagram } from '../features/course/course-diagram.tsx';
import { JoinClass } from '../features/course/join-class.tsx';
import { nextStep, type NextStep } from '../features/course/next-step.ts';
import { courseQuery, type CourseMapView } from '../features/course/queries.ts';
import { Schedule } from '../features/course/schedule.tsx';
import { sayDate } from '../ui/dates.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Quantity } from '../ui/quantity.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return cacheOf(args).fetchQuery(courseQuery);
}

export function Component() {
  const { data: map } = useSuspenseQuery(courseQuery);
  const step = nextStep(map);
  return (
    <>
      <Sheet>
        <PageTitle>Course map</PageTitle>
        <SheetHead
          kicker="Course map"
          title={<Title text={map.title} />}
          titleBlock={<CourseTitleBlock map={map} />}
        >
          {step && <NextAction step={step} isFirst={map.class !== null} />}
        </SheetHead>
        {!map.class && <JoinClass />}
        <CourseDiagram map={map} />
        <Schedule map={map} />
        <Reference />
      </Sheet>
      <FootStrip
        label="Course"
        links={[
          { label: 'Course map', to: '/course', current: true },
          ...(map.carryOn
            ? [{ label: `Sheet ${map.carryOn.sheet}`, to: `/sheets/${map.carryOn.sheet}` }]
            : []),
          { label: 'Practice', to: '/practice' },
          { label: 'My record', to: '/record' },
        ]}
      />
    </>
  );
}

/** What one looks things up in, from every sheet. */
function Reference() {
  return (
    <nav className="reference-links" aria-label="To look things up">
      <Link to="/tables">Tables</Link>
      <Link to="/glossary">Glossary</Link>
      <Link to="/search">Search</Link>
    </nav>
  );
}

/** Breaks, where it must, after the colon. */
function Title({ text }: { text: string }) {
  const [subject = '', ...rest] = text.split(/(?<=:) /);
  return (
    <>
      <span className="quantity">{subject}</span> {rest.join(' ')}
    </>
  );
}

/** The one solid button, unless joining a class comes first. */
function NextAction({ step, isFirst }: { step: NextStep; isFirst: boolean }) {
  return (
    <div className="actions">
      <Button asChild size="3" variant={isFirst ? 'solid' : 'outline'}>
        <Link to={step.to}>{step.label}</Link>
      </Button>
      <small>
        {step.detail}
        {step.minutes !== undefined && (
          <>
            {' '}
            About <Quantity value={step.minutes} unit="min" /> left.
          </>
        )}
      </small>
    </div>
  );
}

/** "O. Marchetti" stays on one line. */
function keepInitials(names: string): string {
  return names.replaceAll('. ', '.\u00a0');
}

function CourseTitleBlock({ map }: { map: CourseMapView }) {
  const { data: session } = useSuspenseQuery(sessionQuery);
  const account = session?.account;
  return (
    <TitleBlock
      cells={[
        { label: 'Drawing no.', value: map.number, kind: 'strong' },
        { label: 'Revision', value: map.revision },
        { label: 'Issued', value: sayDate(map.issued) },
        { label: 'Legal owner', value: map.owner, span: 4 },
        { label: 'Trainer', value: map.trainer ? keepInitials(map.trainer) : 'none yet' },
        { label: 'Trainee', value: account ? `${account.givenName} ${account.familyName}` : '' },
        { label: 'Class', value: map.class?.name ?? 'none yet' },
        { label: 'Enrolled', value: map.enrolledOn ? sayDate(map.enrolledOn) : 'not yet' },
      ]}
    />
  );
}
