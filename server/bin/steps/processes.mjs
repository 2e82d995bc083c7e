import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';

/** A step that cannot go on, in words meant for the person at the terminal. */
export class StepFailed extends Error {}

/**
 * Runs a program to its end and gives back what it wrote.
 *
 * @param options - `input` goes to its standard input; `withoutPipes` is for programs that
 *   leave a daemon behind, which would hold the pipes open. The rest is what `spawn` takes:
 *   `detached` keeps Ctrl-C in the terminal away from what must not be cut short.
 */
export function run(command, args, options = {}) {
  const { input, withoutPipes = false, ...spawnOptions } = options;
  return new Promise((resolve) => {
    const stdio = withoutPipes
      ? 'ignore'
      : [input === undefined ? 'ignore' : 'pipe', 'pipe', 'pipe'];
    const child = spawn(command, args, { ...spawnOptions, stdio });
    let stdout = '';
    let stderr = '';
    child.stdout?.setEncoding('utf8').on('data', (text) => (stdout += text));
    child.stderr?.setEncoding('utf8').on('data', (text) => (stderr += text));
    child.on('error', (error) => resolve({ code: 127, stdout, stderr: error.message }));
    child.on('close', (code) => resolve({ code: code ?? 1, stdout, stderr }));
    if (input !== undefined) child.stdin.on('error', () => {}).end(input);
  });
}

/** Runs a program and fails with its own words when it does. */
export async function runOrFail(command, args, options = {}) {
  const result = await run(command, args, options);
  if (result.code === 0) return result;
  const said = `${result.stdout}\n${result.stderr}`.trim();
  const name = [command, ...args.slice(0, 2)].map((part) => part.split('/').at(-1)).join(' ');
  throw new StepFailed(`${name} failed (exit ${result.code}).${said ? `\n${said}` : ''}`);
}

/** Whether a process of this number lives and its command line names the given text. */
export function isRunning(pid, commandLineText) {
  if (!Number.isInteger(pid) || pid <= 0) return false;
  try {
    const commandLine = readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ');
    return commandLine.includes(commandLineText);
  } catch {
    return false;
  }
}

/** A process by its number and its starting time: numbers are used again, the pair is not. */
export function identify(pid) {
  try {
    const status = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The program's name stands in brackets and may hold spaces; the 22nd field is the start.
    const fields = status.slice(status.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' ? undefined : { pid, startedAt: fields[19] };
  } catch {
    return undefined;
  }
}

export function isStillThere({ pid, startedAt }) {
  return identify(pid)?.startedAt === startedAt;
}

export const pause = (milliseconds) => new Promise((resolve) => setTimeout(resolve, milliseconds));
