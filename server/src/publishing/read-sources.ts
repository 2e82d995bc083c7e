import { readdir, readFile } from 'node:fs/promises';
import { basename, dirname, join, relative } from 'node:path';
import { ContentNotInOrder } from './problem-list.ts';

export interface SourceFile {
  /** As an author would type it, relative to where publishing was started. */
  readonly path: string;
  readonly text: string;
}

export interface GlossaryFile extends SourceFile {
  /** Folder name of the course. */
  readonly course: string;
}

export interface LessonFile extends SourceFile {
  /** Folder name of the course. */
  readonly course: string;
  /** Drawings beside the lesson, by file name. */
  readonly drawings: ReadonlyMap<string, SourceFile>;
}

export interface Sources {
  readonly courses: readonly SourceFile[];
  readonly lessons: readonly LessonFile[];
  readonly glossaries: readonly GlossaryFile[];
  readonly questions: readonly SourceFile[];
  readonly blueprints: readonly SourceFile[];
}

export interface SourceFolders {
  readonly lessons: string;
  /** Holds `bank/` and `papers/`. */
  readonly assessments: string;
}

async function filesUnder(folder: string): Promise<string[]> {
  const entries = await readdir(folder, { recursive: true, withFileTypes: true }).catch(
    (error: unknown) => {
      if ((error as { code?: unknown }).code !== 'ENOENT') throw error;
      throw new ContentNotInOrder([{ path: folder, line: 1, message: 'there is no such folder' }]);
    },
  );
  return entries
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name))
    .sort();
}

async function read(file: string): Promise<SourceFile> {
  const text = await readFile(file, 'utf8');
  return { path: relative(process.cwd(), file), text: text.replaceAll('\r\n', '\n') };
}

async function readGlossary(file: string, lessonsFolder: string): Promise<GlossaryFile> {
  return { ...(await read(file)), course: courseOf(file, lessonsFolder) };
}

const courseOf = (file: string, lessonsFolder: string) =>
  relative(lessonsFolder, file).split(/[\\/]/)[0] ?? '';

async function readLesson(file: string, lessonsFolder: string): Promise<LessonFile> {
  const folder = dirname(file);
  const names = (await readdir(folder)).filter((name) => name.endsWith('.svg')).sort();
  const drawings = new Map<string, SourceFile>();
  for (const name of names) drawings.set(name, await read(join(folder, name)));
  return { ...(await read(file)), course: courseOf(file, lessonsFolder), drawings };
}

/** Reads everything that may be published; nothing is judged yet. */
export async function readSources(folders: SourceFolders): Promise<Sources> {
  const lessonFiles = (await filesUnder(folders.lessons)).filter((file) => file.endsWith('.md'));
  const named = (name: string) => lessonFiles.filter((file) => basename(file) === name);
  const isLesson = (file: string) => !['course.md', 'glossary.md'].includes(basename(file));
  const sheets = async (folder: string) => {
    const files = await filesUnder(join(folders.assessments, folder));
    const isSheet = (file: string) => file.endsWith('.md') && !file.endsWith('README.md');
    return Promise.all(files.filter(isSheet).map(read));
  };
  return {
    courses: await Promise.all(named('course.md').map(read)),
    glossaries: await Promise.all(
      named('glossary.md').map((file) => readGlossary(file, folders.lessons)),
    ),
    lessons: await Promise.all(
      lessonFiles.filter(isLesson).map((file) => readLesson(file, folders.lessons)),
    ),
    questions: await sheets('bank'),
    blueprints: await sheets('papers'),
  };
}
