import { Button } from '@radix-ui/themes';
import { useSuspenseQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession, sessionQuery } from '../api/session.ts';
import '../features/papers/papers.css';
import { paperQuery, type PaperView } from '../features/papers/queries.ts';
import { StartForm } from '../features/papers/start-form.tsx';
import { sayDate, sayDateInFull } from '../ui/dates.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { TitleBlock } from '../ui/title-block.tsx';
import { upperFirst } from '../ui/words.ts';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return cacheOf(args).fetchQuery(paperQuery(args.params.slug ?? ''));
}

export function Component() {
  const { slug = '' } = useParams();
  const { data: paper } = useSuspenseQuery(paperQuery(slug));
  const { data: session } = useSuspenseQuery(sessionQuery);
  return (
    <>
      <PageTitle>{paper.title}</PageTitle>
      <Sheet>
        <SheetHead
          kicker="Certification paper"
          title={paper.title}
          standfirst={`Passing it certifies you as ${paper.scheme.title}, for ${paper.scheme.validYears} years.`}
          titleBlock={<PaperBlock paper={paper} />}
        />
        <div className="columns two paper-columns">
          <section>
            <Standing paper={paper} />
            {paper.standing.state === 'open' && session && (
              <StartForm
                paper={paper}
                givenName={session.account.givenName}
                familyName={session.account.familyName}
              />
            )}
          </section>
          <section>
            <PaperFacts paper={paper} />
          </section>
        </div>
      </Sheet>
    </>
  );
}

function PaperBlock({ paper }: { paper: PaperView }) {
  return (
    <TitleBlock
      cells={[
        { label: 'Paper no.', value: paper.number, span: 2, kind: 'strong' },
        { label: 'Questions', value: String(paper.questions), span: 2 },
        { label: 'Minutes', value: String(Math.ceil(paper.minutes)), span: 2, kind: 'strong' },
        { label: 'Marks', value: paper.marks === null ? 'varies' : String(paper.marks), span: 2 },
        { label: 'To pass', value: `${paper.passPercent} %`, span: 2 },
        { label: 'Wait between sittings', value: `${paper.waitDays} days`, span: 2 },
        { label: 'How it is sat', value: upperFirst(paper.sat), span: 6 },
      ]}
    />
  );
}

function Standing({ paper }: { paper: PaperView }) {
  const { standing } = paper;
  if (standing.state === 'sitting' && standing.sittingId) {
    return (
      <>
        <h2>Your paper is open</h2>
        <p>The clock is running. The same questions and the same time wait for you.</p>
        <div className="actions">
          <Button size="3" asChild>
            <Link to={`/sittings/${standing.sittingId}?q=1`}>Go on with the paper</Link>
          </Button>
        </div>
      </>
    );
  }
  if (standing.state === 'passed') {
    return (
      <>
        <h2>You have passed</h2>
        <p>Your certificate is in your record.</p>
        <div className="actions">
          {standing.certificateId && (
            <Button size="3" asChild>
              <Link to={`/certificates/${standing.certificateId}`}>Open the certificate</Link>
            </Button>
          )}
        </div>
      </>
    );
  }
  if (standing.state === 'waiting') return <Waiting paper={paper} />;
  return null;
}

function Waiting({ paper }: { paper: PaperView }) {
  const { mayStartAt, reasons } = paper.standing;
  return (
    <>
      <h2>
        {mayStartAt ? `You may sit again from ${sayDateInFull(mayStartAt)}` : reasons.join(' ')}
      </h2>
      <p>
        {mayStartAt
          ? `${paper.waitDays} days lie between two sittings, so that there is time to practise. The next is drawn anew from the same plan, with fresh figures.`
          : 'The result opens in your record within a minute, and comes to you by e-mail.'}
      </p>
      <EarlierSittings paper={paper} />
    </>
  );
}

function EarlierSittings({ paper }: { paper: PaperView }) {
  return (
    <ul className="dash-list">
      {paper.standing.sittings.map((sitting) => (
        <li key={sitting.id}>
          <Link to={`/sittings/${sitting.id}/result`}>Sat on {sayDate(sitting.startedAt)}</Link>
          {sitting.passed === false && ', not passed: what to practise'}
        </li>
      ))}
    </ul>
  );
}

function PaperFacts({ paper }: { paper: PaperView }) {
  return (
    <>
      <h2>What the certificate will say</h2>
      <ul className="dash-list">
        {paper.scheme.scope.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
      <h2>What it does not say</h2>
      <ul className="dash-list">
        {paper.scheme.limits.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
      <h2>What you may use</h2>
      <ul className="dash-list">
        {paper.aids.map((aid) => (
          <li key={aid}>{aid}</li>
        ))}
      </ul>
      {paper.extraTimePercent > 0 && (
        <p>Your {Math.ceil(paper.minutes)} minutes include the extra time approved for you.</p>
      )}
      <h2>If you do not agree with the result</h2>
      <p>{paper.appeal}</p>
    </>
  );
}
