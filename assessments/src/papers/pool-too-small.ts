/** A paper asks for more questions of a subject than the pool holds. */
export class PoolTooSmall extends Error {
  readonly shortages: { subject: string; wanted: number; available: number }[];

  constructor(shortages: { subject: string; wanted: number; available: number }[]) {
    const list = shortages.map(
      (s) => `${s.subject}: ${s.wanted} wanted, ${s.available} in the pool`,
    );
    super(
      `Paper cannot be assembled (${list.join('; ')}); add questions to the pool or ask for fewer.`,
    );
    this.name = 'PoolTooSmall';
    this.shortages = shortages;
  }
}
