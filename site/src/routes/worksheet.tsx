import '../features/worksheets/worksheets.css';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { bankQuery } from '../features/practice/queries.ts';
import { AttemptsTable } from '../features/worksheets/attempts-table.tsx';
import { BuildUp } from '../features/worksheets/build-up.tsx';
import { worksheetQuery, type WorksheetSummary } from '../features/worksheets/queries.ts';
import { StartAttempt } from '../features/worksheets/start-attempt.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Quantity } from '../ui/quantity.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return cacheOf(args).fetchQuery(worksheetQuery(args.params['number'] ?? ''));
}

export function Component() {
  const { number = '' } = useParams();
  const { data: summary } = useSuspenseQuery(worksheetQuery(number));
  return (
    <>
      <Sheet width="narrow">
        <PageTitle>{`Worksheet ${number}, ${summary.title}`}</PageTitle>
        <SheetHead
          kicker={`Worksheet of unit ${summary.unit.number}, ${summary.unit.title}`}
          title={summary.title}
          standfirst={
            <>
              Fresh figures every time, marked at once with the worked answer beside yours. At{' '}
              <Quantity value={summary.passPercent} unit="%" /> the lamp of unit{' '}
              {summary.unit.number} is lit.
            </>
          }
          titleBlock={
            <TitleBlock
              cells={[
                { label: 'Worksheet no.', value: number, kind: 'strong' },
                { label: 'Questions', value: summary.questions },
                { label: 'To pass', value: <Quantity value={summary.passPercent} unit="%" /> },
                { label: 'Subject', value: summary.unit.title, span: 4 },
                { label: 'Attempts', value: summary.attempts.length },
              ]}
            />
          }
        >
          <StartAttempt number={number} label={sayStart(summary)}>
            <Link to={`/course#unit-${summary.unit.number}`}>Course map</Link>
          </StartAttempt>
        </SheetHead>
        <AttemptsTable summary={summary} />
        <Questions summary={summary} />
      </Sheet>
      <FootStrip
        label="Worksheet"
        links={[
          { label: 'Course map', to: '/course' },
          { label: `Worksheet ${number}`, to: `/worksheets/${number}`, current: true },
        ]}
      />
    </>
  );
}

/** Left out while the list of questions is on its way, or when it does not come. */
function Questions({ summary }: { summary: WorksheetSummary }) {
  const { data: bank } = useQuery(bankQuery);
  const questions = summary.practise.flatMap(
    (slug) => bank?.questions.find((question) => question.slug === slug) ?? [],
  );
  return questions.length > 0 && <BuildUp questions={questions} />;
}

function sayStart({ attempts }: WorksheetSummary): string {
  const open = attempts.find(({ handedInAt }) => handedInAt === null);
  if (open) return `Go on with attempt ${open.attempt}`;
  return attempts.length === 0 ? 'Work it' : 'Work it again with fresh figures';
}
