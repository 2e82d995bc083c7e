import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { fromRoot, root } from './paths.mjs';
import { runOrFail } from './processes.mjs';

const stampFolder = fromRoot('node_modules', '.cache', 'ferrule');
const shared = ['package-lock.json', 'tsconfig.base.json'];
const compiled = ['assessments', 'certificates', 'server'];

const serverPart = {
  name: 'server',
  sources: [...shared, ...compiled],
  products: compiled.map((workspace) =>
    join(workspace, 'dist', workspace === 'server' ? 'main.js' : 'index.js'),
  ),
  // The compiler's own record changes with every build, also with one made by hand.
  record: 'server/tsconfig.tsbuildinfo',
};
const sitePart = {
  name: 'site',
  sources: [...shared, 'certificates', 'site'],
  products: ['site/dist/index.html'],
  record: 'site/dist/index.html',
};

const passedOver = /^(node_modules|dist|dist-types|test|e2e|bin|fakes|bank|\..*)$/;
const isNoSource = /\.spec\.tsx?$|\.tsbuildinfo$/;

function listFiles(path) {
  return readdirSync(path, { withFileTypes: true }).flatMap((entry) => {
    if (passedOver.test(entry.name) || isNoSource.test(entry.name)) return [];
    const child = join(path, entry.name);
    return entry.isDirectory() ? listFiles(child) : [child];
  });
}

/** One hash over the names and bytes of files and of what folders hold. */
function hashSources(paths) {
  const hash = createHash('sha256');
  const files = paths.flatMap((path) =>
    /\.json$/.test(path) ? [fromRoot(path)] : listFiles(fromRoot(path)),
  );
  for (const file of files.sort()) {
    hash
      .update(`${relative(root, file)}\0`)
      .update(readFileSync(file))
      .update('\0');
  }
  return hash.digest('hex');
}

const readIfThere = (path) => (existsSync(path) ? readFileSync(path, 'utf8') : '');

const stampOf = ({ sources, record }) =>
  createHash('sha256')
    .update(hashSources(sources))
    .update(readIfThere(fromRoot(record)))
    .digest('hex');

const isBuilt = ({ products }) => products.every((product) => existsSync(fromRoot(product)));

async function buildWhenStale(part, build) {
  const stampFile = join(stampFolder, part.name);
  if (isBuilt(part) && readIfThere(stampFile) === stampOf(part)) return 'unchanged';
  await build();
  mkdirSync(stampFolder, { recursive: true });
  writeFileSync(stampFile, stampOf(part));
  return 'built';
}

/** Takes out what was compiled from a file that is gone: an old migration must not linger. */
function removeOrphans(workspace) {
  const dist = fromRoot(workspace, 'dist');
  if (!existsSync(dist)) return;
  for (const name of readdirSync(dist, { recursive: true })) {
    const source = name.replace(/(\.d\.ts|\.js)(\.map)?$/, '.ts');
    if (source === name || existsSync(fromRoot(workspace, 'src', source))) continue;
    rmSync(join(dist, name));
  }
}

const local = (...parts) => fromRoot('node_modules', ...parts);

async function compile(target, signal) {
  // The compiler trusts its record even when what it wrote was deleted.
  const force = isBuilt(serverPart) ? [] : ['--force'];
  const args = [local('typescript', 'bin', 'tsc'), '-b', target, ...force];
  await runOrFail(process.execPath, args, { cwd: root, signal });
  compiled.forEach(removeOrphans);
}

/** Checks every workspace's types and compiles the libraries and the server. */
export const buildEverything = (signal) => compile('.', signal);

/** Compiles the server and the libraries it stands on, when a source changed. */
export const buildServer = (signal) => buildWhenStale(serverPart, () => compile('server', signal));

/** Builds the site, when a source changed. */
export const buildSite = (signal) =>
  buildWhenStale(sitePart, () =>
    runOrFail(process.execPath, [local('vite', 'bin', 'vite.js'), 'build'], {
      cwd: fromRoot('site'),
      env: { ...process.env, NODE_ENV: 'production' },
      signal,
    }),
  );

/** What the database was prepared with: the compiled code and the published files. */
export const hashContent = () =>
  hashSources([...serverPart.sources, 'lessons', 'assessments/bank']);
