import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';

const MINUTE_MS = 60_000;
const RESULT = /^\s*(\S+)\s*=\s*([-+]?\d\S*)\s*$/;

/**
 * Runs a netlist of `test/reference/` in ngspice and gives every printed or measured result by its
 * name, in small letters as ngspice prints it: `v(bp)`, `i_shunt`.
 *
 * The netlist ends its control section with `quit 0`: without it ngspice reports a failure.
 *
 * @param values - figures put where the netlist has `{{name}}`.
 * @throws {Error} when ngspice is not installed, the netlist fails or a figure is left out.
 */
export function runNgspice(
  netlist: string,
  values: Readonly<Record<string, number | string>> = {},
): ReadonlyMap<string, number> {
  const text = readFileSync(new URL(`reference/${netlist}`, import.meta.url), 'utf8');
  const filled = text.replace(/\{\{(\w+)\}\}/g, (_, name: string) => {
    const value = values[name];
    if (value === undefined) throw new Error(`${netlist} needs a figure for ${name}; give one.`);
    return String(value);
  });
  return resultsIn(simulate(netlist, filled));
}

function simulate(netlist: string, text: string): string {
  const run = spawnSync('ngspice', ['-b'], { input: text, encoding: 'utf8', timeout: MINUTE_MS });
  if (run.error) {
    const why = run.error.message;
    throw new Error(`ngspice did not run (${why}); install Debian’s package ngspice.`);
  }
  const said = `${run.stdout}\n${run.stderr}`;
  if (run.status !== 0 || /\berror\b|failed|no such vector/i.test(said)) {
    throw new Error(`ngspice could not run ${netlist}:\n${said}`);
  }
  return run.stdout;
}

function resultsIn(said: string): ReadonlyMap<string, number> {
  const results = new Map<string, number>();
  for (const line of said.split('\n')) {
    const [, name, figure] = RESULT.exec(line) ?? [];
    if (name !== undefined && figure !== undefined) results.set(name, Number(figure));
  }
  return results;
}
