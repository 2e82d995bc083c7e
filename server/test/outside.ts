import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** A folder in which programs of other people look at what the server made. */
export class Bench {
  readonly folder = mkdtempSync(join(tmpdir(), 'ferrule-bench-'));

  write(name: string, contents: Uint8Array | string): void {
    writeFileSync(join(this.folder, name), contents);
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

  remove(): void {
    rmSync(this.folder, { recursive: true });
  }
}
