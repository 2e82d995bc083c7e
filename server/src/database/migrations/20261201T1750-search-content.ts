export const searchContent = {
  name: '20261201T1750-search-content',
  sql: `
-- What is current, cut into what can be found; publishing writes all of it anew.
CREATE TABLE search_entries (
  id integer PRIMARY KEY,
  kind text NOT NULL CONSTRAINT search_entries_kind CHECK (kind IN ('sheet', 'paragraph', 'table', 'term')),
  title text NOT NULL,
  sheet text,
  paragraph integer,
  heading text,
  link text NOT NULL,
  body text NOT NULL,
  configuration regconfig NOT NULL,
  -- First of all what it is called, then what introduces it, then the rest.
  words tsvector NOT NULL
);
CREATE INDEX search_entries_words ON search_entries USING gin (words);

-- Every word of them with how often it is used, to guess what a mistyped one was meant to be.
CREATE TABLE search_words (
  word text PRIMARY KEY,
  uses integer NOT NULL CONSTRAINT search_words_used CHECK (uses > 0)
);

GRANT SELECT ON search_entries, search_words TO ferrule_web;
`,
};
