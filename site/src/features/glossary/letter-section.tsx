import { Link } from 'react-router-dom';
import { type Letter } from './by-letter.ts';
import { type TermView } from './queries.ts';

interface LetterSectionProps extends Letter {
  /** The place the address names, as it stands there. */
  hash: string;
}

/** One letter of the glossary. */
export function LetterSection({ letter, terms, hash }: LetterSectionProps) {
  return (
    <section className="letter" id={letterAnchor(letter)} aria-label={`Letter ${letter}`}>
      <h2>{letter}</h2>
      <dl>
        {terms.map((term) => (
          <TermRow
            key={term.anchor}
            term={term}
            isNamed={hash === `#${encodeURIComponent(term.anchor)}`}
          />
        ))}
      </dl>
    </section>
  );
}

/** Not to be taken for the term of the same name. */
export const letterAnchor = (letter: string) => `letter-${letter === '#' ? 'other' : letter}`;

function TermRow({ term, isNamed }: { term: TermView; isNamed: boolean }) {
  return (
    <div className={isNamed ? 'named' : undefined} id={term.anchor}>
      <dt>{term.term}</dt>
      <dd>
        <p>{term.means}</p>
        {term.also.length > 0 && <p className="fine">Also: {term.also.join(', ')}</p>}
        {term.sheets.length > 0 && (
          <p className="fine term-sheets">
            {term.sheets.map(({ number, title }) => (
              <Link key={number} to={`/sheets/${number}`}>
                Sheet {number}, {title}
              </Link>
            ))}
          </p>
        )}
      </dd>
    </div>
  );
}
