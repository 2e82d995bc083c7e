import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** A folder for one spec file and the programs of other people that look at what is in it. */
export class Bench {
  readonly folder = mkdtempSync(join(tmpdir(), 'ferrule-certificates-'));

  path(name: string): string {
    return join(this.folder, name);
  }

  write(name: string, contents: Uint8Array | string): string {
    writeFileSync(this.path(name), contents);
    return this.path(name);
  }

  /** The program's result, and everything it said besides. */
  run(
    program: string,
    ...parameters: string[]
  ): { status: number | null; result: string; said: string } {
    const { status, stdout, stderr, error } = spawnSync(program, parameters, {
      cwd: this.folder,
      encoding: 'utf8',
      timeout: 30_000,
    });
    if (error) throw error;
    return { status, result: stdout, said: stdout + stderr };
  }

  /** The first page in grey. */
  draw(pdf: Uint8Array, dpi = 100): Drawing {
    this.write('page.pdf', pdf);
    this.run('pdftoppm', '-gray', '-r', String(dpi), '-singlefile', 'page.pdf', 'page');
    return new Drawing(readFileSync(this.path('page.pgm')), dpi);
  }

  remove(): void {
    rmSync(this.folder, { recursive: true });
  }
}

/** Pixels of a page, asked for in the design's unit of 1/96 inch. */
export class Drawing {
  readonly width: number;
  readonly height: number;
  private readonly grey: Uint8Array;

  constructor(
    pgm: Buffer,
    private readonly dpi: number,
  ) {
    const [header = '', width, height] = /^P5\s+(\d+)\s+(\d+)\s+255\s/.exec(
      pgm.toString('latin1', 0, 60),
    ) ?? [''];
    this.width = Number(width);
    this.height = Number(height);
    this.grey = pgm.subarray(header.length);
  }

  /** The share of dark pixels in a box. */
  ink(box: { x: number; y: number; width: number; height: number }): number {
    return this.darkColumns(box).reduce((sum, dark) => sum + dark, 0) / this.columnsIn(box);
  }

  /** How many of the box's columns have any ink: the width of what is drawn. */
  inkedWidth(box: { x: number; y: number; width: number; height: number }): number {
    const inked = this.darkColumns(box).filter((dark) => dark > 0).length;
    return (inked * 96) / this.dpi;
  }

  private columnsIn({ width }: { width: number }): number {
    return Math.round((width * this.dpi) / 96);
  }

  private darkColumns(box: { x: number; y: number; width: number; height: number }): number[] {
    const scale = this.dpi / 96;
    const left = Math.round(box.x * scale);
    const top = Math.round(box.y * scale);
    const rows = Math.round(box.height * scale);
    return Array.from({ length: this.columnsIn(box) }, (_, column) => {
      let dark = 0;
      for (let row = top; row < top + rows; row += 1) {
        if ((this.grey[row * this.width + left + column] ?? 255) < 128) dark += 1;
      }
      return dark / rows;
    });
  }
}
