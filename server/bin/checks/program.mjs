import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fromRoot, root } from '../steps/paths.mjs';

const graceMilliseconds = 5000;

/** Reports and whatever the tools leave behind; removed when the tests are over. */
export const scratchFolder = mkdtempSync(join(tmpdir(), 'ferrule-scratch-'));

/** The script of an installed command-line tool: at the root or in the workspace that uses it. */
export function tool(path, workspace = 'site') {
  const candidates = [fromRoot('node_modules', path), fromRoot(workspace, 'node_modules', path)];
  return candidates.find((candidate) => existsSync(candidate)) ?? candidates[0];
}

function endGroup(child) {
  const send = (signal) => {
    try {
      process.kill(-child.pid, signal);
    } catch {
      // Every process of the group has ended already.
    }
  };
  send('SIGTERM');
  setTimeout(() => send('SIGKILL'), graceMilliseconds).unref();
}

/**
 * Runs a tool of the project with what it starts in a process group of its own, so that all
 * of it can be ended together: when asked to, and when it takes too long.
 */
export function runTool(script, args, { signal, env, cwd = root, limitSeconds }) {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [script, ...args], {
      cwd,
      env: { ...process.env, NO_COLOR: '1', FORCE_COLOR: '0', TMPDIR: scratchFolder, ...env },
      detached: true,
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let said = '';
    const hear = (text) => (said += text);
    child.stdout.setEncoding('utf8').on('data', hear);
    child.stderr.setEncoding('utf8').on('data', hear);
    const end = () => endGroup(child);
    const tooLong = setTimeout(() => {
      hear(`\nEnded after ${limitSeconds} s: it takes too long.`);
      end();
    }, limitSeconds * 1000);
    signal.addEventListener('abort', end, { once: true });
    const finish = (code) => {
      clearTimeout(tooLong);
      signal.removeEventListener('abort', end);
      resolve({ code, said: said.trim() });
    };
    child.once('error', (error) => {
      hear(error.message);
      finish(127);
    });
    child.once('close', (code) => finish(code ?? 1));
  });
}
