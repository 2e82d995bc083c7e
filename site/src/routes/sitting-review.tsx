import { Button } from '@radix-ui/themes';
import { useMutation, useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { Link, Navigate, useNavigate, useParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { type DeskState } from '../features/sittings/answer-desk.ts';
import { DeskStrips } from '../features/sittings/desk-strips.tsx';
import { PaperBar } from '../features/sittings/paper-bar.tsx';
import {
  handIn,
  type SittingItem,
  sittingQuery,
  type SittingView,
  takeOver,
} from '../features/sittings/queries.ts';
import { standingsOf, standingWords } from '../features/sittings/question-terminals.tsx';
import '../features/sittings/sittings.css';
import { useAnswerDesk } from '../features/sittings/use-answer-desk.ts';
import { sayTimeOfDay } from '../ui/dates.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { ProblemCallout } from '../ui/problem-callout.tsx';
import { type Standing } from '../ui/question/views.ts';
import { RunningHead } from '../ui/running-head.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { PennantSign } from '../ui/symbols/signs.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  // What was written on the question pages is newer than anything kept from before.
  return cacheOf(args).fetchQuery({ ...sittingQuery(args.params.id ?? ''), staleTime: 0 });
}

export function Component() {
  const { id = '' } = useParams();
  const { data: sitting } = useSuspenseQuery(sittingQuery(id));
  if (sitting.state === 'handed-in') return <Navigate to={`/sittings/${id}/result`} replace />;
  return <Review key={String(sitting.readOnly)} sitting={sitting} />;
}

function Review({ sitting }: { sitting: SittingView }) {
  const { state } = useAnswerDesk(sitting);
  const cache = useQueryClient();
  const navigate = useNavigate();
  const handingIn = useMutation({
    mutationFn: () => handIn(sitting.id),
    onSuccess: async () => {
      cache.removeQueries({ queryKey: sittingQuery(sitting.id).queryKey });
      await navigate(`/sittings/${sitting.id}/result`);
    },
  });
  const standings = standingsOf(sitting.items, state);
  const blank = standings.filter((standing) => standing !== 'answered').length;
  if (state.stopped === 'closed') return <Navigate to={`/sittings/${sitting.id}/result`} replace />;
  const takeOverHere = async () =>
    cache.setQueryData(sittingQuery(sitting.id).queryKey, await takeOver(sitting.id));
  return (
    <>
      <PageTitle>{`Review, ${sitting.paper.title}`}</PageTitle>
      <RunningHead end={<span className="muted">{sitting.paper.title}, being sat</span>} />
      <Sheet>
        <SheetHead
          kicker={`${sitting.paper.title}, review`}
          title="Before you hand in"
          standfirst={sayWhatIsLeft(blank)}
          titleBlock={<ReviewBlock sitting={sitting} />}
        />
        <PaperBar
          state={state}
          answered={`${sitting.items.length - blank} of ${sitting.items.length} answered`}
          closesAt={sitting.closesAt}
          minutes={sitting.minutes}
        />
        <DeskStrips
          state={state}
          closesAt={sitting.closesAt}
          onTakeOver={() => void takeOverHere()}
        />
        <ReviewTable sitting={sitting} standings={standings} state={state} />
        {handingIn.error && <ProblemCallout error={handingIn.error} />}
        <div className="action-strip">
          <p>
            {blank > 0 && <b>{sayWhatIsLeft(blank)} </b>}
            Handing in ends the sitting: nothing can be changed afterwards.
          </p>
          <div className="buttons">
            <Button size="3" variant="outline" asChild>
              <Link to={`/sittings/${sitting.id}?q=1`}>Back to question 1</Link>
            </Button>
            <Button
              size="3"
              disabled={handingIn.isPending || state.waiting > 0 || state.stopped !== null}
              onClick={() => handingIn.mutate()}
            >
              {state.waiting > 0 ? 'Waiting for the signal' : 'Hand in for marking'}
            </Button>
          </div>
        </div>
      </Sheet>
    </>
  );
}

function sayWhatIsLeft(blank: number): string {
  if (blank === 0) return 'Every question is answered.';
  if (blank === 1) return 'One question is not fully answered.';
  return `${blank} questions are not fully answered.`;
}

function ReviewBlock({ sitting }: { sitting: SittingView }) {
  return (
    <TitleBlock
      cells={[
        { label: 'Paper no.', value: sitting.paper.number, span: 2, kind: 'strong' },
        { label: 'Questions', value: String(sitting.items.length), span: 2 },
        { label: 'Marks', value: String(sitting.marks), span: 2, kind: 'strong' },
        { label: 'Candidate', value: sitting.name, span: 4 },
        { label: 'Closes', value: sayTimeOfDay(sitting.closesAt), span: 2 },
      ]}
    />
  );
}

interface ReviewTableProps {
  sitting: SittingView;
  standings: Standing[];
  state: DeskState;
}

function ReviewTable({ sitting, standings, state }: ReviewTableProps) {
  return (
    <section className="section" aria-label="Questions">
      <table className="review-table">
        <thead>
          <tr>
            <th scope="col">No.</th>
            <th scope="col">Question</th>
            <th scope="col">Marks</th>
            <th scope="col">State</th>
            <th scope="col">Last written</th>
            <th scope="col">Receipt</th>
          </tr>
        </thead>
        <tbody>
          {sitting.items.map((item, index) => (
            <ReviewRow
              key={item.key}
              {...{ sitting, item, state }}
              standing={standings[index] ?? 'not'}
            />
          ))}
        </tbody>
      </table>
    </section>
  );
}

interface ReviewRowProps {
  sitting: SittingView;
  item: SittingItem;
  standing: Standing;
  state: DeskState;
}

function ReviewRow({ sitting, item, standing, state }: ReviewRowProps) {
  const last = state.receipts.find((receipt) => receipt.item === item.number);
  return (
    <tr className={standing === 'answered' ? undefined : 'unfinished'}>
      <td>{item.number}</td>
      <th scope="row">
        <Link to={`/sittings/${sitting.id}?q=${item.number}`}>{item.question.title}</Link>
        {item.comeBack && (
          <>
            {' '}
            <PennantSign />
            <span className="visually-hidden">come back to</span>
          </>
        )}
      </th>
      <td className="number">{item.question.marks}</td>
      <td>{standingWords[standing]}</td>
      <td>{last ? sayTimeOfDay(last.savedAt) : '–'}</td>
      <td className="mono">{last?.receipt ?? '–'}</td>
    </tr>
  );
}
