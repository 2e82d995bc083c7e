/** The plan of a paper: what it asks, how it is sat, and the scheme a pass leads to. */
export interface Blueprint {
  formatVersion: number;
  slug: string;
  number: string;
  title: string;
  revision: string;
  course: string;
  minutes: number;
  passPercent: number;
  waitDays: number;
  sat: string;
  questions: { subject: string; count: number }[];
  aids: string[];
  /** Markdown. */
  agreement: string;
  scheme: {
    slug: string;
    revision: string;
    title: string;
    scope: string[];
    limits: string[];
    validYears: number;
    zone: string;
  };
  appeal: string;
  language: string;
}
