import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, type Sequelize } from 'sequelize';
import type { SearchEntry } from './search-entry.ts';
import { CLOSE, OPEN } from './snippet.ts';

/** One thing found; the headline marks where. */
export interface FoundEntry extends Pick<
  SearchEntry,
  'kind' | 'title' | 'sheet' | 'paragraph' | 'heading' | 'link'
> {
  readonly headline: string;
  /** How its whole text begins and ends: the headline may be a piece of it. */
  readonly opening: string;
  readonly closing: string;
}

const HEADLINE = `StartSel=${OPEN}, StopSel=${CLOSE}, MaxFragments=1, MaxWords=32, MinWords=16, ShortWord=2`;

const MOST_COMPLETIONS = 12;

/**
 * The query is put together for every configuration there is. Words are letters and digits alone,
 * so none can be read as an operator; the last may be the beginning of a word. What is called just
 * so comes first.
 */
const FIND = `
WITH asked AS (
  SELECT configuration, CASE WHEN $3 THEN all_words ELSE any_word END AS query
  FROM (SELECT DISTINCT configuration FROM search_entries) AS used,
  LATERAL (
    SELECT
      to_tsquery(configuration, array_to_string(words, ' & ')) AS all_words,
      to_tsquery(configuration, array_to_string(words, ' | ')) AS any_word
    FROM (SELECT $1::text[] AS words) AS typed
  ) AS read
), best AS (
  SELECT entry.*, query,
    ts_rank_cd('{0.1, 0.3, 0.6, 1.0}', words, query, 1) AS rank
  FROM search_entries AS entry JOIN asked USING (configuration)
  WHERE words @@ query
  ORDER BY lower(title) = $5 DESC, rank DESC, id
  LIMIT $2
)
SELECT kind, title, sheet, paragraph, heading, link,
  ts_headline(configuration, body, query, $4) AS headline,
  left(body, 20) AS opening, right(body, 20) AS closing
FROM best ORDER BY lower(title) = $5 DESC, rank DESC, id`;

@Injectable()
export class SearchRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /**
   * @param words - of letters and digits alone, the last of which may be a beginning.
   * @param how - whether every word must be there, and how many results are wanted at most.
   */
  async find(
    words: readonly string[],
    how: { every: boolean; most: number },
  ): Promise<FoundEntry[]> {
    const [last = ''] = words.slice(-1);
    // A beginning may be longer than what the language keeps of the whole word: insulat, insul.
    const beginnings = [`${last}:*`, ...(await this.completions(last))].join(' | ');
    const lexemes = [...words.slice(0, -1), `(${beginnings})`];
    return this.sequelize.query<FoundEntry>(FIND, {
      bind: [lexemes, how.most, how.every, HEADLINE, words.join(' ')],
      type: QueryTypes.SELECT,
    });
  }

  private async completions(beginning: string): Promise<string[]> {
    const rows = await this.sequelize.query<{ word: string }>(
      'SELECT word FROM search_words WHERE starts_with(word, $1) ORDER BY uses DESC LIMIT $2',
      { bind: [beginning, MOST_COMPLETIONS], type: QueryTypes.SELECT },
    );
    return rows.map(({ word }) => word);
  }

  /** Every word that is used, with how often. */
  async vocabulary(): Promise<ReadonlyMap<string, number>> {
    const rows = await this.sequelize.query<{ word: string; uses: number }>(
      'SELECT word, uses FROM search_words',
      { type: QueryTypes.SELECT },
    );
    return new Map(rows.map(({ word, uses }) => [word, uses]));
  }
}
