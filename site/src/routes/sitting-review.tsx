import { DeskStrips } from '../features/sittings/desk-strips.tsx';
import { HandIn } from '../features/sittings/hand-in.tsx';
import { PaperBar } from '../features/sittings/paper-bar.tsx';
import { type SittingView } from '../features/sittings/queries.ts';
import { ReviewTable } from '../features/sittings/review-table.tsx';
import { sayStandings } from '../features/sittings/review-words.ts';
import { useSittingDesk } from '../features/sittings/sitting-desk.ts';
import { BareHead } from '../features/sittings/sitting-head.tsx';
import { sayMoment, sayTimeOfDay } from '../ui/dates.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Quantity } from '../ui/quantity.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { TitleBlock } from '../ui/title-block.tsx';
import { upperFirst } from '../ui/words.ts';

export function Component() {
  const shared = useSittingDesk();
  const { sitting, standings } = shared;
  return (
    <>
      <PageTitle>{`Review, ${sitting.paper.title}`}</PageTitle>
      <BareHead
        sitting={sitting}
        to={{ label: 'Question 1', path: `/sittings/${sitting.id}?q=1` }}
      />
      <Sheet>
        <SheetHead
          kicker={sitting.paper.title}
          title="Before you hand in"
          standfirst={sayStandings(standings)}
          titleBlock={<ReviewBlock sitting={sitting} />}
        />
        <DeskStrips {...shared} />
        <PaperBar {...shared} />
        <ReviewTable {...shared} />
        <div className="columns two">
          <section>
            <h2>When you hand in</h2>
            <p>
              The paper closes and cannot be opened again. It is marked at once, and the result
              opens here. Until then, and until {sayTimeOfDay(sitting.closesAt)}, every answer can
              be changed.
            </p>
          </section>
          <section>
            <h2>If the signal drops as you do</h2>
            <p>
              The page says so and nothing is lost: your answers are at the school. At{' '}
              {sayTimeOfDay(sitting.closesAt)} the paper is handed in as it stands.
            </p>
          </section>
        </div>
        <HandIn shared={shared} />
      </Sheet>
    </>
  );
}

function ReviewBlock({ sitting }: { sitting: SittingView }) {
  return (
    <TitleBlock
      cells={[
        { label: 'Paper no.', value: sitting.paper.number, span: 2, kind: 'strong' },
        { label: 'Questions', value: String(sitting.items.length), span: 2 },
        { label: 'Marks', value: String(sitting.marks), span: 2, kind: 'strong' },
        { label: 'How it is sat', value: upperFirst(sitting.paper.sat), span: 4 },
        {
          label: 'Time allowed',
          value: <Quantity value={Math.ceil(sitting.minutes)} unit="min" />,
          span: 2,
        },
        { label: 'Candidate', value: sitting.name, span: 2 },
        { label: 'Opened', value: sayMoment(sitting.startedAt), span: 2 },
        { label: 'Closes', value: sayTimeOfDay(sitting.closesAt), span: 2 },
      ]}
    />
  );
}
