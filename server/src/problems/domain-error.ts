/** A rule of the product that was broken. Knows no HTTP. */
export abstract class DomainError extends Error {
  abstract readonly code: string;
  /** Extra members of the problem document, part of its contract. */
  readonly extensions: Record<string, unknown> = {};

  constructor(message: string) {
    super(message);
    this.name = new.target.name;
  }
}
