import { Injectable } from '@nestjs/common';
import { SearchRepository, type FoundEntry } from './search.repository.ts';
import type { Found } from './search.schemas.ts';
import { readSnippet } from './snippet.ts';
import { nearestWord, wordsIn } from './vocabulary.ts';

const MOST_RESULTS = 20;
const MOST_WORDS = 10;
const LONGEST_WORD = 40;

@Injectable()
export class SearchService {
  constructor(private readonly repository: SearchRepository) {}

  /** Looks for all words; failing that for those nearest to them, failing that for any. */
  async search(query: string): Promise<Found> {
    const words = wordsIn(query)
      .slice(0, MOST_WORDS)
      .map((word) => word.slice(0, LONGEST_WORD));
    if (words.length === 0) return present(query, [], null);
    const found = await this.find(words, true);
    if (found.length > 0) return present(query, found, null);
    const meant = await this.meant(words);
    const corrected = meant.join(' ') === words.join(' ') ? null : meant.join(' ');
    const near = corrected === null ? [] : await this.find(meant, true);
    if (near.length > 0) return present(query, near, corrected);
    const some = words.length > 1 ? await this.find(meant, false) : [];
    return present(query, some, some.length > 0 ? corrected : null);
  }

  private find(words: readonly string[], every: boolean): Promise<FoundEntry[]> {
    return this.repository.find(words, { every, most: MOST_RESULTS + 1 });
  }

  private async meant(words: readonly string[]): Promise<string[]> {
    const vocabulary = await this.repository.vocabulary();
    return words.map((word, at) => nearestWord(word, vocabulary, at === words.length - 1));
  }
}

function present(query: string, found: readonly FoundEntry[], corrected: string | null): Found {
  return {
    ...{ query, corrected, more: found.length > MOST_RESULTS },
    results: found.slice(0, MOST_RESULTS).map(({ headline, opening, closing, ...entry }) => ({
      ...entry,
      snippet: readSnippet(headline, { opening, closing }),
    })),
  };
}
