import '../features/tables/tables.css';
import { useSuspenseQuery } from '@tanstack/react-query';
import { cacheOf, type LoaderArgs, requireSession } from '../api/session.ts';
import { tablesQuery, type TablesView } from '../features/tables/queries.ts';
import { ReferenceTable } from '../features/tables/reference-table.tsx';
import { SymbolsTable } from '../features/tables/symbols-table.tsx';
import { useNamedPlace } from '../ui/named-place.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { FootStrip } from '../ui/thumb-index.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return cacheOf(args).ensureQueryData(tablesQuery);
}

export function Component() {
  const { data } = useSuspenseQuery(tablesQuery);
  useNamedPlace();
  return (
    <>
      <Sheet>
        <PageTitle>Tables</PageTitle>
        <SheetHead
          kicker="To look things up in"
          title="Tables"
          standfirst="The figures the sheets and the marking use. Each says what it assumes, where it comes from and how far to trust it."
          titleBlock={
            <TitleBlock
              cells={[
                { label: 'Tables', value: String(data.tables.length), kind: 'strong', span: 3 },
                { label: 'Symbols', value: String(data.symbols.list.length), span: 3 },
              ]}
            />
          }
        />
        <Contents data={data} />
        {data.tables.map((table, index) => (
          <ReferenceTable key={table.slug} table={table} number={index + 1} />
        ))}
        <SymbolsTable symbols={data.symbols} number={data.tables.length + 1} />
        <p className="tables-local">
          <b>{data.local}</b>
        </p>
      </Sheet>
      <FootStrip
        label="Course"
        links={[
          { label: 'Course map', to: '/course' },
          { label: 'Glossary', to: '/glossary' },
          { label: 'Search', to: '/search' },
        ]}
      />
    </>
  );
}

function Contents({ data }: { data: TablesView }) {
  const entries = [...data.tables, { slug: 'symbols', title: 'Symbols of the drawings' }];
  return (
    <nav className="tables-contents" aria-labelledby="contents-title">
      <h2 id="contents-title">Contents</h2>
      <ol>
        {entries.map(({ slug, title }, index) => (
          <li key={slug}>
            <a href={`#${slug}`}>
              <b>{index + 1}</b> <span>{title}</span>
            </a>
          </li>
        ))}
      </ol>
    </nav>
  );
}
