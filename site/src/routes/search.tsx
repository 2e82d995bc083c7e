import '../features/search/search.css';
import { Button } from '@radix-ui/themes';
import { useEffect, useRef } from 'react';
import { Form, useLocation, useSearchParams } from 'react-router-dom';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { longestQuery, searchQuery } from '../features/search/queries.ts';
import { SearchResults } from '../features/search/search-results.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';

const wordsOf = (query: URLSearchParams) => (query.get('q') ?? '').trim().slice(0, longestQuery);

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  const words = wordsOf(new URL(args.request.url).searchParams);
  // Asked early; what fails is said on the page.
  if (words) void cacheOf(args).prefetchQuery(searchQuery(words));
  return null;
}

export function Component() {
  const [query] = useSearchParams();
  const words = wordsOf(query);
  return (
    <>
      <Sheet>
        <PageTitle>{words ? `Search: ${words}` : 'Search'}</PageTitle>
        <SheetHead
          kicker="Sheets, tables and glossary"
          title="Search"
          standfirst="Each place is given by sheet and paragraph, as you would quote it on the phone."
        >
          <SearchForm key={words} words={words} />
        </SheetHead>
        <SearchResults words={words} />
      </Sheet>
      <FootStrip
        label="Course"
        links={[
          { label: 'Course map', to: '/course' },
          { label: 'Tables', to: '/tables' },
          { label: 'Glossary', to: '/glossary' },
        ]}
      />
    </>
  );
}

function SearchForm({ words }: { words: string }) {
  const fieldRef = useRef<HTMLInputElement>(null);
  const location = useLocation();
  const isTyping = (location.state as { isTyping?: boolean } | null)?.isTyping ?? false;
  useEffect(() => {
    // Whoever came by the key goes on typing. Later than the heading takes the focus.
    if (isTyping) setTimeout(() => fieldRef.current?.focus());
  }, [isTyping, location.key]);
  return (
    <Form className="search-form not-printed" action="/search" role="search">
      <label>
        <span className="field-label">Look for</span>
        <input
          ref={fieldRef}
          className="entry"
          type="search"
          name="q"
          aria-keyshortcuts="/"
          autoComplete="off"
          maxLength={longestQuery}
          defaultValue={words}
        />
      </label>
      <Button size="3" type="submit">
        Search
      </Button>
    </Form>
  );
}
