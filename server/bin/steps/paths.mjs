import { createHash } from 'node:crypto';
import { chmodSync, mkdirSync, realpathSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The checkout. */
export const root = realpathSync(fileURLToPath(new URL('../../../', import.meta.url)));

export const fromRoot = (...parts) => join(root, ...parts);

/**
 * Where the demonstration keeps its data. PostgreSQL runs under another account than root,
 * which may not be able to reach the checkout: root's data lies under /var/lib instead.
 */
export function makeDataFolder() {
  if (process.getuid() !== 0) {
    const folder = fromRoot('.data');
    mkdirSync(folder, { recursive: true });
    chmodSync(folder, 0o700);
    return folder;
  }
  const checkout = createHash('sha256').update(root).digest('hex').slice(0, 16);
  const folder = join('/var/lib/ferrule', checkout);
  mkdirSync(folder, { recursive: true });
  chmodSync('/var/lib/ferrule', 0o755);
  chmodSync(folder, 0o711);
  return folder;
}
