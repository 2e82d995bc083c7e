import '../features/results/results.css';
import { Button } from '@radix-ui/themes';
import { useQuery } from '@tanstack/react-query';
import { Link, redirect, useLocation, useParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { MarksTable } from '../features/results/marks-table.tsx';
import { PracticeList } from '../features/results/practice-list.tsx';
import { resultQuery, type ResultView } from '../features/results/queries.ts';
import { ResultCertificate } from '../features/results/result-certificate.tsx';
import { ResultVerdict } from '../features/results/result-verdict.tsx';
import { sittingQuery } from '../features/sittings/queries.ts';
import { sayDate, sayDateInFull, sayMoment } from '../ui/dates.ts';
import { useFocusAfterWait } from '../ui/focus-on-heading.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { FailedState } from '../ui/states.tsx';
import { Strip } from '../ui/strip.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';
import { Facts } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  const [cache, id] = [cacheOf(args), args.params.id ?? ''];
  const result = await cache.fetchQuery(resultQuery(id));
  if (result) return null;
  const sitting = await cache.fetchQuery({ ...sittingQuery(id), staleTime: 0 });
  // eslint-disable-next-line @typescript-eslint/only-throw-error -- how a loader goes elsewhere
  if (sitting.state === 'open') throw redirect(`/sittings/${id}?q=1`);
  return null;
}

export function Component() {
  const { id = '' } = useParams();
  const { data: result, error, refetch } = useQuery(resultQuery(id));
  useFocusAfterWait(Boolean(result));
  if (error && !result) {
    return (
      <Sheet>
        <PageTitle>Result</PageTitle>
        <SheetHead title="The result" />
        <FailedState error={error} retry={() => void refetch()} />
      </Sheet>
    );
  }
  return result ? <Result result={result} /> : <BeingMarked />;
}

/** The paper is in; the marks follow within seconds. */
function BeingMarked() {
  return (
    <Sheet busy>
      <PageTitle>Being marked</PageTitle>
      <SheetHead
        kicker="Certification paper"
        title="Handed in, and being marked"
        standfirst="This takes a few seconds. You may stay here or go: the result stands in your record, and it comes to you by e-mail."
      />
      <LateAnswers />
      <p className="visually-hidden" role="status">
        Your paper is handed in and being marked.
      </p>
    </Sheet>
  );
}

function Result({ result }: { result: ResultView }) {
  return (
    <>
      <PageTitle>{result.passed ? 'Passed' : 'Not passed'}</PageTitle>
      <Sheet className="result-page">
        <LateAnswers />
        <ResultVerdict result={result} />
        <ResultFacts result={result} />
        <div className="columns two-one marks-columns">
          <section>
            <h2>Where the marks went</h2>
            <MarksTable result={result} />
          </section>
          <section>
            <h2>{result.passed ? 'Worth a look' : 'What to practise'}</h2>
            <PracticeList result={result} />
          </section>
        </div>
        <div className="columns two">
          <section>
            {result.passed ? <Certificate result={result} /> : <Again result={result} />}
          </section>
          <section>
            <h2>If you think the mark is wrong</h2>
            <p>{result.appeal}</p>
            <p>
              Quote paper {result.paper.number} of {sayDateInFull(result.satOn)} and the receipts of
              your answers.
            </p>
          </section>
        </div>
        <div className="action-strip">
          <p>
            <b>On your record since {sayMoment(result.markedAt)}.</b> The questions and their key
            stay with the school; you see the marks by subject.
          </p>
          <span className="buttons">
            <Button size="3" variant="outline" asChild>
              <Link to="/record">My record</Link>
            </Button>
          </span>
        </div>
      </Sheet>
      <FootStrip
        label="Result"
        links={[
          { label: 'Course map', to: '/course' },
          { label: 'My record', to: '/record' },
        ]}
      />
    </>
  );
}

function ResultFacts({ result }: { result: ResultView }) {
  const handedIn = result.handedInHow === 'by-candidate' ? 'By you' : 'At the deadline';
  return (
    <div className="result-facts">
      <Facts
        cells={[
          { label: 'Paper', value: result.paper.number, span: 1 },
          { label: 'Sat', value: sayDate(result.satOn), span: 1 },
          { label: 'Handed in', value: handedIn, span: 1 },
          { label: 'Marked', value: sayMoment(result.markedAt), span: 1 },
          { label: 'Per cent', value: `${result.percent} %`, span: 1 },
          {
            label: 'To pass',
            value: `${result.passPercent} %, ${result.passMarks} marks`,
            span: 1,
          },
        ]}
      />
    </div>
  );
}

function Certificate({ result }: { result: ResultView }) {
  return (
    <>
      <h2>Your certificate</h2>
      <ResultCertificate result={result} />
    </>
  );
}

function Again({ result }: { result: ResultView }) {
  return (
    <>
      <h2>Sit it again</h2>
      <p>
        {result.maySitAgainAt ? (
          <>
            From <b>{sayDateInFull(result.maySitAgainAt)}</b>, drawn anew from the same plan, with
            fresh figures.
          </>
        ) : (
          'You may sit again now, drawn anew from the same plan, with fresh figures.'
        )}
      </p>
      <div className="actions">
        <Button size="3" variant="outline" asChild>
          <Link to={`/papers/${result.paper.slug}`}>The paper’s page</Link>
        </Button>
      </div>
    </>
  );
}

/** Told once, on the way here from the paper: what did not arrive in time. */
function LateAnswers() {
  const { state } = useLocation() as { state: { late?: number } | null };
  const late = state?.late ?? 0;
  if (late === 0) return null;
  return (
    <Strip kind="said" across>
      <p>
        <b>
          {late === 1 ? 'One answer' : `${late} answers`} did not reach the school before the paper
          closed
        </b>{' '}
        and {late === 1 ? 'does' : 'do'} not count. If the signal was at fault, say so in an appeal.
      </p>
    </Strip>
  );
}
