import { pathToFileURL } from 'node:url';
import { fromRoot } from './paths.mjs';

/** The people one can sign in as and the class one can join, as the compiled seed names them. */
export async function readDemonstrationPeople() {
  const compiled = fromRoot('server', 'dist', 'seed', 'people.js');
  const seed = await import(pathToFileURL(compiled).href);
  const people = seed.demonstrationPeople.map(({ email, givenName, familyName, roles }) => ({
    email,
    name: `${givenName} ${familyName}`.trim(),
    role: roles.map((role) => seed.roleNames[role]).join(', '),
  }));
  return { people, classToJoin: seed.demonstrationClass };
}
