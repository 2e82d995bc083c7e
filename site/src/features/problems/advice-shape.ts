/** What a kind of problem means for the person who met it, and what to do. */
export interface Advice {
  title: string;
  means: string;
  steps: string[];
  link?: { label: string; to: string };
}
