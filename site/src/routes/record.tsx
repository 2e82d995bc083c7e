import '../features/record/record.css';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { cacheOf, type LoaderArgs, requireSession, sessionQuery } from '../api/session.ts';
import { ownCertificatesQuery } from '../features/certificates/holder-queries.ts';
import { courseQuery, type CourseMapView } from '../features/course/queries.ts';
import { paperQuery } from '../features/papers/queries.ts';
import { NextPractice } from '../features/record/next-practice.tsx';
import { subjectRecordsQuery } from '../features/record/queries.ts';
import { RecordCertificates } from '../features/record/record-certificates.tsx';
import { RecordSittings } from '../features/record/record-sittings.tsx';
import { RecordSubjects } from '../features/record/record-subjects.tsx';
import { RecordWorksheets } from '../features/record/record-worksheets.tsx';
import { sayDate } from '../ui/dates.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { FailedState, RuledLines } from '../ui/states.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return cacheOf(args).fetchQuery(courseQuery);
}

export function Component() {
  const { data: map } = useSuspenseQuery(courseQuery);
  return (
    <>
      <PageTitle>My record</PageTitle>
      <Sheet>
        <SheetHead
          kicker={map.title}
          title="My record"
          standfirst="What you have sat, what was marked, and the certificates that came of it."
          titleBlock={<RecordBlock map={map} />}
        />
        <section className="section">
          <h2>Certificates</h2>
          <Certificates />
        </section>
        <Subjects />
        <div className="columns two">
          <section>
            <h2>Paper</h2>
            {map.paper ? (
              <Sittings slug={map.paper.slug} />
            ) : (
              <p>No paper is set for this course.</p>
            )}
          </section>
          <section>
            <h2>Worksheets</h2>
            <RecordWorksheets map={map} />
          </section>
        </div>
      </Sheet>
      <FootStrip
        label="Record"
        links={[
          { label: 'Course map', to: '/course' },
          { label: 'Practice', to: '/practice' },
          { label: 'My record', to: '/record', current: true },
        ]}
      />
    </>
  );
}

function RecordBlock({ map }: { map: CourseMapView }) {
  const { data: session } = useSuspenseQuery(sessionQuery);
  const account = session?.account;
  const done = map.units.filter(({ worksheet }) => worksheet?.lit).length;
  const issued = map.units.filter(({ worksheet }) => worksheet).length;
  return (
    <TitleBlock
      cells={[
        { label: 'Course', value: map.number, span: 3, kind: 'strong' },
        { label: 'Worksheets passed', value: `${done} of ${issued}`, span: 3, kind: 'strong' },
        {
          label: 'Trainee',
          value: account ? `${account.givenName} ${account.familyName}`.trim() : '',
          span: 3,
        },
        { label: 'Class', value: map.class?.name ?? 'none yet', span: 3 },
        { label: 'Enrolled', value: map.enrolledOn ? sayDate(map.enrolledOn) : 'not yet', span: 6 },
      ]}
    />
  );
}

function Certificates() {
  const list = useQuery(ownCertificatesQuery);
  if (list.isPending) return <RuledLines what="your certificates" />;
  if (list.isError) return <FailedState error={list.error} retry={() => void list.refetch()} />;
  return <RecordCertificates certificates={list.data.certificates} />;
}

/** What has been shown, and what is worth practising next. */
function Subjects() {
  const records = useQuery(subjectRecordsQuery);
  if (records.isPending) return <Waiting what="what you have shown" />;
  if (records.isError) {
    return (
      <div className="section">
        <FailedState error={records.error} retry={() => void records.refetch()} />
      </div>
    );
  }
  return (
    <div className="columns record-shown">
      <section>
        <h2>What to practise next</h2>
        <NextPractice next={records.data.next} />
      </section>
      <section>
        <h2>What you have shown</h2>
        <p className="fine">
          A question counts as shown when it is done whole, without a hint, for at least four fifths
          of its marks, on a worksheet or in practice.
        </p>
        <RecordSubjects subjects={records.data.subjects} />
      </section>
    </div>
  );
}

function Waiting({ what }: { what: string }) {
  return (
    <div className="section">
      <RuledLines what={what} />
    </div>
  );
}

function Sittings({ slug }: { slug: string }) {
  const paper = useQuery(paperQuery(slug));
  if (paper.isPending) return <RuledLines what="your sittings" />;
  if (paper.isError) return <FailedState error={paper.error} retry={() => void paper.refetch()} />;
  return <RecordSittings paper={paper.data} />;
}
