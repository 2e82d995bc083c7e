import { randomBytes } from 'node:crypto';
import { mkdirSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import PostalMime from 'postal-mime';

const largestCount = 500;
const idPattern = /^\d{13}-\d{6}-[0-9a-f]{8}$/;

/** What a mail said, in the shape the page shows and tests read. */
async function readMail(raw, envelope) {
  const parsed = await PostalMime.parse(raw);
  return {
    from: parsed.from?.address ?? envelope.from,
    to: envelope.to,
    subject: parsed.subject ?? '',
    text: parsed.text ?? '',
    html: parsed.html ?? '',
    headers: parsed.headers.map(({ key, value }) => ({ name: key, value })),
    attachments: parsed.attachments.map((attachment) => ({
      name: attachment.filename ?? 'attachment',
      type: attachment.mimeType,
      bytes: attachment.content.byteLength,
      content: Buffer.from(attachment.content).toString('base64'),
    })),
  };
}

const summarise = ({ id, receivedAt, from, to, subject }) => ({
  id,
  receivedAt,
  from,
  to,
  subject,
});

/** A file cut short by a power failure is passed over, so that it does not hide the rest. */
function summariseReadable(load) {
  try {
    return [summarise(load())];
  } catch {
    return [];
  }
}

/** The newest mails, each in a file of its own so that a restart still has them. */
export function openKeptMails(folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const pathOf = (id) => join(folder, `${id}.json`);
  const load = (id) => JSON.parse(readFileSync(pathOf(id), 'utf8'));
  const summaries = readdirSync(folder)
    .map((name) => name.replace(/\.json$/, ''))
    .filter((id) => idPattern.test(id))
    .sort()
    .flatMap((id) => summariseReadable(() => load(id)));
  let count = 0;

  const forgetOldest = () => {
    while (summaries.length > largestCount) {
      rmSync(pathOf(summaries.shift().id), { force: true });
    }
  };
  const keep = async (raw, envelope) => {
    const content = await readMail(raw, envelope);
    const now = Date.now();
    count += 1;
    const order = String(count % 1_000_000).padStart(6, '0');
    const id = `${now}-${order}-${randomBytes(4).toString('hex')}`;
    const mail = { id, receivedAt: new Date(now).toISOString(), ...content };
    const draft = join(folder, `${id}.draft`);
    writeFileSync(draft, JSON.stringify(mail), { mode: 0o600 });
    renameSync(draft, pathOf(id));
    summaries.push(summarise(mail));
    forgetOldest();
  };
  const isFor = (address) => (summary) =>
    !address || summary.to.some((to) => to.toLowerCase() === address.toLowerCase());

  forgetOldest();
  return {
    keep,
    list: (address) => summaries.filter(isFor(address)).reverse(),
    find: (id) => (summaries.some((summary) => summary.id === id) ? load(id) : undefined),
  };
}
