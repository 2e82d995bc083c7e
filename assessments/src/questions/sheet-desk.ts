import { SheetInvalid } from '../sheets/errors.ts';
import { type SheetFile } from '../sheets/sheet-file.ts';
import { refusalOf } from './names.ts';
import { type Sheet } from './sheet-schema.ts';
import { type Dimension } from './units.ts';

/** A sheet being checked: what is declared so far, and what is wrong with it. */
export interface Desk {
  path: string;
  sheet: Sheet;
  file: SheetFile<Sheet>;
  issues: { line: number; message: string }[];
  dimensions: Map<string, Dimension>;
}

/** A fault in a field below the one that is being checked. */
class FieldFault extends Error {
  readonly field: PropertyKey[];

  constructor(field: PropertyKey[], message: string) {
    super(message);
    this.field = field;
  }
}

/** Runs one check on a field below the one that is being checked: its line is told, not the whole's. */
export function inField<T>(field: PropertyKey[], check: () => T): T {
  try {
    return check();
  } catch (error) {
    const below = error instanceof FieldFault ? error.field : [];
    throw new FieldFault([...field, ...below], error instanceof Error ? error.message : '');
  }
}

/** Runs one check; what it throws becomes an issue at the field's line. */
export function attempt<T>(desk: Desk, field: PropertyKey[], check: () => T): T[] {
  try {
    return [check()];
  } catch (error) {
    const message = error instanceof Error ? error.message : String(error);
    const whole = error instanceof FieldFault ? [...field, ...error.field] : field;
    desk.issues.push({
      line: desk.file.lineOf(whole),
      message: `${whole.join(' › ')}: ${message}`,
    });
    return [];
  }
}

/** @throws {SheetInvalid} with every issue so far, in the order of the lines. */
export function stopIfWrong(desk: Desk): void {
  if (desk.issues.length === 0) return;
  throw new SheetInvalid(
    desk.path,
    desk.issues.toSorted((a, b) => a.line - b.line),
  );
}

/**
 * Takes a name into use.
 *
 * @throws {Error} when it is a unit, a function or taken already.
 */
export function declare(desk: Desk, name: string, dimension: Dimension): void {
  const refusal =
    refusalOf(name) ?? (desk.dimensions.has(name) ? `Name "${name}" is declared twice.` : null);
  if (refusal) throw new Error(refusal);
  desk.dimensions.set(name, dimension);
}
