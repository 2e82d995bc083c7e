import { pathToFileURL } from 'node:url';
import { fromRoot } from './paths.mjs';

/** The addresses of the people the demonstration school has, from the compiled seed. */
export async function demonstrationAddresses() {
  const { demonstrationPeople } = await import(
    pathToFileURL(fromRoot('server', 'dist', 'seed', 'people.js')).href
  );
  return demonstrationPeople.map(({ email }) => email);
}
