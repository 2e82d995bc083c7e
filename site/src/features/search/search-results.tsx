import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { EmptyState, FailedState, RuledLines } from '../../ui/states.tsx';
import { type FoundView, type Result, searchQuery } from './queries.ts';
import { sayPlace, Snippet } from './snippet.tsx';

/** What was found, best first, each with the place to quote. */
export function SearchResults({ words }: { words: string }) {
  const { data: found, error, refetch } = useQuery(searchQuery(words));
  if (words === '') return <NothingAsked />;
  if (error) return <FailedState error={error} retry={() => void refetch()} />;
  if (!found) return <RuledLines what="what was found" />;
  if (found.results.length === 0) return <NothingFound words={words} />;
  return (
    <section className="section" aria-labelledby="found-title">
      <h2 id="found-title">{sayFound(found)}</h2>
      <p className="visually-hidden" role="status">
        {sayFound(found)}
      </p>
      <ol className="results-found">
        {found.results.map((result) => (
          <FoundRow key={`${result.link} ${result.title}`} result={result} />
        ))}
      </ol>
    </section>
  );
}

function sayFound({ results, more, corrected, query }: FoundView): string {
  const count = results.length === 1 ? 'One place' : `${results.length} places`;
  const said = more ? `The best ${results.length} places` : count;
  return corrected === null
    ? `${said} for “${query}”`
    : `Nothing has “${query}”. ${said} for “${corrected}”`;
}

function FoundRow({ result }: { result: Result }) {
  const { heading, link, snippet, title } = result;
  return (
    <li>
      <p className="found-place">{sayPlace(result)}</p>
      <div>
        <Link to={link}>{heading && heading !== title ? `${title}: ${heading}` : title}</Link>
        <p>
          <Snippet snippet={snippet} />
        </p>
      </div>
    </li>
  );
}

function NothingAsked() {
  return (
    <EmptyState title="Nothing asked yet">
      Type a word of the trade, a quantity or a part: drop, tail current, tinned. The key / comes
      back to this field from anywhere.
    </EmptyState>
  );
}

function NothingFound({ words }: { words: string }) {
  return (
    <EmptyState
      title={`Nothing for “${words}”`}
      actions={
        <>
          <Link to="/glossary">Glossary</Link>
          <Link to="/tables">Tables</Link>
        </>
      }
    >
      Try fewer words, or another word for the same thing.
    </EmptyState>
  );
}
