import { join } from 'node:path';
import { fromRoot } from '../steps/paths.mjs';
import { run } from '../steps/processes.mjs';
import { runTool, scratchFolder, tool } from './program.mjs';

const limitSeconds = 120;

/** Writes the API's description and the site's types anew and compares them with the kept ones. */
export async function checkApiDrift(signal) {
  const document = join(scratchFolder, 'openapi.json');
  const types = join(scratchFolder, 'schema.gen.ts');
  const pairs = [
    [fromRoot('server', 'openapi.json'), document],
    [fromRoot('site', 'src', 'api', 'schema.gen.ts'), types],
  ];
  const writers = [
    [fromRoot('server', 'dist', 'cli', 'write-openapi.js'), [document]],
    [tool('openapi-typescript/bin/cli.js'), [document, '-o', types]],
  ];
  for (const [script, args] of writers) {
    const written = await runTool(script, args, { signal, limitSeconds });
    if (written.code !== 0) return written;
  }
  const differences = await Promise.all(pairs.map((pair) => run('diff', ['-u', ...pair])));
  const said = differences.map(({ stdout, stderr }) => stdout + stderr).join('');
  return { code: differences.every(({ code }) => code === 0) ? 0 : 1, said };
}
