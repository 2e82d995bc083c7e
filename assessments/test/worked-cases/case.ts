/**
 * A whole question worked on one set of figures, against results from outside the library.
 * Given values in their own units; results in the unit of their step.
 */
export interface Case {
  slug: string;
  /** Where the results come from: a table, a published example, a program, or a sum by hand in full. */
  source: string;
  /** Drawn values by name, and figures read off a curve; fixed ones may be left out. */
  given: Record<string, number>;
  results: Record<string, number>;
}
