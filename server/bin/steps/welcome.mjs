const caution = 'This is training. Local codes and licensed practice come first, always.';

function table(rows) {
  const widths = rows[0].map((_, column) => Math.max(...rows.map((row) => row[column].length)));
  return rows.map((row) =>
    `  ${row.map((cell, i) => cell.padEnd(widths[i] + 2)).join('')}`.trimEnd(),
  );
}

/** What someone needs to know to walk through the demonstration. */
export function welcomeToDemonstration({ siteUrl, mailUrl, people, classToJoin, seconds }) {
  const rows = people.map(({ role, name, email, passphrase }) => [role, name, email, passphrase]);
  return [
    '',
    `Ferrule is running (${seconds} s).`,
    '',
    `  Site  ${siteUrl}`,
    `  Mail  ${mailUrl}  (every mail it sends ends there)`,
    '',
    'People, with the passphrases of this installation:',
    ...table(rows),
    '',
    `Someone new signs up on the site, confirms the address from the mail page and joins the`,
    `${classToJoin.name} with the code ${classToJoin.joinCode}.`,
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
    ...(link
      ? ['', 'The first administrator signs up here; the link serves once:', `  ${link}`]
      : []),
    '',
    caution,
    '',
    'Ctrl-C stops the server.',
  ].join('\n');
}
