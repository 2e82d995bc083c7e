/** What a result of a search is. */
export type SearchKind = 'sheet' | 'paragraph' | 'table' | 'term';

/** Something that can be found, ready to be indexed. */
export interface SearchEntry {
  readonly kind: SearchKind;
  /** Of the sheet or table, or the term. */
  readonly title: string;
  readonly sheet: string | null;
  readonly paragraph: number | null;
  readonly heading: string | null;
  /** Path of the page and the place on it. */
  readonly link: string;
  /** What it is called: weighs most. */
  readonly names: string;
  /** What introduces it. */
  readonly intro: string;
  /** Plain text, from which the snippet is cut. */
  readonly body: string;
  readonly language: string;
}
