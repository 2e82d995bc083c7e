import '../features/glossary/glossary.css';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useLocation } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { byLetter } from '../features/glossary/by-letter.ts';
import { LetterSection, letterAnchor } from '../features/glossary/letter-section.tsx';
import { glossaryQuery } from '../features/glossary/queries.ts';
import { useNamedPlace } from '../ui/named-place.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { EmptyState } from '../ui/states.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return cacheOf(args).ensureQueryData(glossaryQuery);
}

export function Component() {
  const { data: glossary } = useSuspenseQuery(glossaryQuery);
  const { hash } = useLocation();
  useNamedPlace();
  const letters = byLetter(glossary.terms);
  return (
    <>
      <Sheet>
        <PageTitle>Glossary</PageTitle>
        <SheetHead
          kicker="Words of the course"
          title="Glossary"
          standfirst="Every word as the sheets use it, with the sheet that explains it."
          titleBlock={
            <TitleBlock
              cells={[
                { label: 'Words', value: String(glossary.terms.length), kind: 'strong', span: 3 },
                { label: 'Revision', value: glossary.revision ?? 'none yet', span: 3 },
              ]}
            />
          }
        />
        {letters.length === 0 && (
          <EmptyState title="No words yet">They come with the sheets that explain them.</EmptyState>
        )}
        <nav className="contents-strip" aria-label="Letters">
          {letters.map(({ letter }) => (
            <a key={letter} href={`#${letterAnchor(letter)}`} aria-label={`Letter ${letter}`}>
              {letter}
            </a>
          ))}
        </nav>
        <div lang={glossary.language}>
          {letters.map((letter) => (
            <LetterSection key={letter.letter} {...letter} hash={hash} />
          ))}
        </div>
      </Sheet>
      <FootStrip
        label="Course"
        links={[
          { label: 'Course map', to: '/course' },
          { label: 'Tables', to: '/tables' },
          { label: 'Search', to: '/search' },
        ]}
      />
    </>
  );
}
