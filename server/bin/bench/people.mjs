import { randomUUID } from 'node:crypto';
import { sendOrFail } from './http-load.mjs';

const paperSlug = 'final-paper';
const most = 3;
const sameOrigin = { 'sec-fetch-site': 'same-origin' };

/** Signs in and gives back what sends further requests as this person. */
async function signIn(siteUrl, { email, passphrase }) {
  const { headers } = await sendOrFail({
    ...{ url: `${siteUrl}/api/sessions`, method: 'POST', headers: sameOrigin },
    body: { email, password: passphrase },
  });
  const cookie = headers['set-cookie'].map((line) => line.split(';')[0]).join('; ');
  return { cookie, ...sameOrigin };
}

async function findPaper(siteUrl, headers) {
  const { text } = await sendOrFail({ url: `${siteUrl}/api/papers/${paperSlug}`, headers });
  return JSON.parse(text);
}

/** The seeded trainees who may sit the paper now, signed in. */
export async function signInTrainees({ siteUrl, people }) {
  const trainees = [];
  for (const person of people.filter(({ role }) => role === 'Trainee')) {
    const headers = await signIn(siteUrl, person);
    const paper = await findPaper(siteUrl, headers);
    if (paper.standing.state === 'open') trainees.push({ headers, paper, name: person.name });
    if (trainees.length === most) return trainees;
  }
  throw new Error(`Fewer than ${most} seeded trainees may sit ${paperSlug}.`);
}

/** Starts a sitting and gives back the address of its first part. */
export async function startSitting(siteUrl, { headers, paper, name }) {
  const [givenName, ...familyNames] = name.split(' ');
  const { text } = await sendOrFail({
    ...{ url: `${siteUrl}/api/sittings`, method: 'POST', headers },
    body: {
      ...{ paper: paperSlug, agreed: true, agreementHash: paper.agreementHash },
      ...{ givenName, familyName: familyNames.join(' ') },
    },
  });
  const { id, items } = JSON.parse(text);
  const [item] = items;
  const [part] = item.question.parts;
  return `${siteUrl}/api/sittings/${id}/items/${item.key}/parts/${part.id}`;
}

/** A body as the site sends it, with a sequence and a key of its own. */
export const newAnswer = (sequence) => ({
  answer: { text: '12.4', unit: null, option: null, working: '' },
  sequence,
  idempotencyKey: randomUUID(),
});
