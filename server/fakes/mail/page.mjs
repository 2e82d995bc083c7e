const style = `
:root { color-scheme: light dark; --page: #ede9e0; --sheet: #fcfbf8; --ink: #231f1a; --soft: #5f5749; --line: #b9af9e; --link: #85401d; }
@media (prefers-color-scheme: dark) {
  :root { --page: #12110f; --sheet: #1b1916; --ink: #f0eadf; --soft: #c6bdae; --line: #57503f; --link: #e3a27c; }
}
* { box-sizing: border-box; }
body { margin: 0; background: var(--page); color: var(--ink); font: 1.0625rem/1.5 'Source Sans 3', 'Segoe UI', Helvetica, Arial, sans-serif; }
main { max-width: 56rem; margin: 0 auto; padding: 1.5rem 1rem 4rem; }
h1 { font: 600 1.75rem/1.25 Merriweather, Georgia, serif; margin: 0 0 .5rem; overflow-wrap: anywhere; }
h2 { font: 600 1.1875rem/1.3 Merriweather, Georgia, serif; margin: 2rem 0 .5rem; }
a { color: var(--link); }
a:focus-visible, button:focus-visible, input:focus-visible, summary:focus-visible, pre:focus-visible { outline: 3px solid var(--link); outline-offset: 2px; }
p { margin: 0 0 1rem; max-width: 44rem; }
.soft { color: var(--soft); }
.mails { list-style: none; margin: 0; padding: 0; background: var(--sheet); border: 1px solid var(--ink); }
.mails li { padding: .75rem 1rem; overflow-wrap: anywhere; }
.mails li + li { border-top: 1px solid var(--line); }
.mails a { display: inline-block; padding: .25rem 0; font-weight: 600; }
form { display: flex; flex-wrap: wrap; gap: .5rem; align-items: end; margin: 0 0 1rem; }
label { display: grid; flex: 1 1 14rem; }
input, button { font: inherit; min-height: 2.75rem; padding: .25rem .75rem; color: inherit; background: var(--sheet); border: 1px solid var(--ink); border-radius: 0; }
dl { display: grid; grid-template-columns: max-content 1fr; gap: .25rem 1rem; margin: 0 0 1rem; }
dt { color: var(--soft); } dd { margin: 0; overflow-wrap: anywhere; }
pre { background: var(--sheet); border: 1px solid var(--line); padding: 1rem; margin: 0; white-space: pre-wrap; overflow-wrap: anywhere; font: .9375rem/1.5 ui-monospace, 'Liberation Mono', monospace; }
iframe { display: block; width: 100%; height: 38rem; resize: vertical; border: 1px solid var(--ink); }
summary { cursor: pointer; padding: .5rem 0; }`;

const entities = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
const escape = (text) => String(text).replace(/[&<>"']/g, (character) => entities[character]);

const clock = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'medium' });
const time = (instant) =>
  `<time datetime="${escape(instant)}">${escape(clock.format(new Date(instant)))}</time>`;

const page = (title, body) => `<!doctype html>
<html lang="en-GB"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escape(title)}</title><link rel="icon" href="data:,"><style>${style}</style></head>
<body><main>${body}</main></body></html>`;

const listed = (mail) => `<li>
<a href="/messages/${escape(mail.id)}">${escape(mail.subject || '(no subject)')}</a>
<div>To ${escape(mail.to.join(', '))}</div>
<div class="soft">${time(mail.receivedAt)}</div></li>`;

function emptyList(address) {
  if (address)
    return `<p>Nothing was sent to ${escape(address)}. <a href="/">Show every mail</a></p>`;
  return '<p>Nothing has been sent yet. Sign up or ask for a new passphrase, then look again.</p>';
}

/** The list, newest first. */
export function listPage(mails, address = '') {
  const found = mails.length
    ? `<ol class="mails">${mails.map(listed).join('')}</ol>`
    : emptyList(address);
  return page(
    'Mail sent',
    `<h1>Mail sent</h1>
<p>Every mail of this demonstration ends here: none leaves this computer. The newest 500 are kept.</p>
<form method="get" action="/"><label>Sent to (whole address)
<input type="search" name="to" value="${escape(address)}" autocomplete="off"></label>
<button>Look again</button></form>${found}`,
  );
}

const webAddress = /https?:\/\/[^\s<>"']+[^\s<>"'.,;:!?)]/g;

function withLinks(text) {
  let end = 0;
  let marked = '';
  for (const match of text.matchAll(webAddress)) {
    const address = escape(match[0]);
    marked += escape(text.slice(end, match.index));
    marked += `<a href="${address}" target="_blank" rel="noopener noreferrer">${address}</a>`;
    end = match.index + match[0].length;
  }
  return marked + escape(text.slice(end));
}

/** Links in the mail open in a new tab: the frame itself cannot go anywhere. */
function withNewTabs(html) {
  const base = '<base target="_blank">';
  return /<head[^>]*>/i.test(html) ? html.replace(/<head[^>]*>/i, `$&${base}`) : base + html;
}

// The frame may open links in a new tab and do nothing else: no scripts, no forms, no own origin.
const htmlPart = (html) => `<h2 id="html">As HTML</h2>
<iframe title="The mail as HTML" sandbox="allow-popups allow-popups-to-escape-sandbox"
 srcdoc="${escape(withNewTabs(html))}"></iframe>`;

const attachmentPart = (mail) =>
  `<h2>Attachments</h2><ul>${mail.attachments
    .map(
      ({ name, type, bytes }, index) =>
        `<li><a href="/messages/${escape(mail.id)}/attachments/${index}">${escape(name)}</a> (${escape(type)}, ${Math.ceil(bytes / 1024)} kB)</li>`,
    )
    .join('')}</ul>`;

/** One mail: who, when, text, HTML, what is attached and its headers. */
export function mailPage(mail) {
  const headers = mail.headers.map(({ name, value }) => `${name}: ${value}`).join('\n');
  return page(
    mail.subject || '(no subject)',
    `<p><a href="/">All mail</a></p><h1>${escape(mail.subject || '(no subject)')}</h1>
<dl><dt>To</dt><dd>${escape(mail.to.join(', '))}</dd><dt>From</dt><dd>${escape(mail.from)}</dd>
<dt>Sent</dt><dd>${time(mail.receivedAt)}</dd></dl>
<h2>As text</h2><pre tabindex="0" aria-label="The mail as text">${withLinks(mail.text)}</pre>
${mail.html ? htmlPart(mail.html) : ''}${mail.attachments.length ? attachmentPart(mail) : ''}
<details><summary>Headers</summary><pre>${escape(headers)}</pre></details>`,
  );
}

/** What is said when there is no such mail or page. */
export const missingPage = () =>
  page(
    'Not here',
    '<h1>Not here</h1><p>There is no such mail; older ones make way after 500. <a href="/">Show every mail</a></p>',
  );
