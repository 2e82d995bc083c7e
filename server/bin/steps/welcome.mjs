const caution = 'This is training. Local codes and licensed practice come first, always.';

async function listPeople(siteUrl) {
  const reply = await fetch(`${siteUrl}/api/front`, { signal: AbortSignal.timeout(10_000) });
  if (!reply.ok) return [];
  const { people } = await reply.json();
  return people;
}

function table(rows) {
  const widths = rows[0].map((_, column) => Math.max(...rows.map((row) => row[column].length)));
  return rows.map((row) =>
    `  ${row.map((cell, i) => cell.padEnd(widths[i] + 2)).join('')}`.trimEnd(),
  );
}

/** What someone needs to know to walk through the demonstration. */
export async function welcomeToDemonstration({ siteUrl, mailUrl, passphrases, seconds }) {
  const people = await listPeople(siteUrl);
  const rows = people.map(({ role, name, email }) => [role, name, email, passphrases[email] ?? '']);
  return [
    '',
    `Ferrule is running (${seconds} s).`,
    '',
    `  Site  ${siteUrl}`,
    `  Mail  ${mailUrl}  (every mail it sends ends there)`,
    '',
    'People, with the passphrases of this installation:',
    ...(rows.length ? table(rows) : ['  none']),
    '',
    'This is a demonstration with invented people: nobody is certified for work by it.',
    caution,
    '',
    'Ctrl-C stops all of it and keeps the data. npm start -- --fresh begins again.',
  ].join('\n');
}

export function welcomeToOwnDatabase({ siteUrl, localUrl, link, seconds }) {
  return [
    '',
    `Ferrule is running (${seconds} s) for ${siteUrl} and listens at ${localUrl}.`,
    ...(link ? ['', link] : []),
    '',
    caution,
    '',
    'Ctrl-C stops the server.',
  ].join('\n');
}
