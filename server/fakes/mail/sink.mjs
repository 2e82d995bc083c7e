import { createServer } from 'node:http';
import { pathToFileURL } from 'node:url';
import { SMTPServer } from 'smtp-server';
import { openKeptMails } from './kept-mails.mjs';
import { listPage, mailPage, missingPage } from './page.mjs';

const host = '127.0.0.1';
const largestMailBytes = 20_000_000;
const mediaType = /^[\w.+-]+\/[\w.+-]+$/;
const policy =
  "default-src 'none'; style-src 'unsafe-inline'; img-src data: http://127.0.0.1:* http://localhost:*; form-action 'self'; base-uri 'self'; frame-ancestors 'none'";

function readStream(stream) {
  return new Promise((resolve, reject) => {
    const chunks = [];
    stream.on('data', (chunk) => chunks.push(chunk));
    stream.on('end', () => resolve(Buffer.concat(chunks)));
    stream.on('error', reject);
  });
}

function refusal(code, message) {
  return Object.assign(new Error(message), { responseCode: code });
}

function makeSmtpServer(mails) {
  return new SMTPServer({
    disabledCommands: ['STARTTLS', 'AUTH'],
    authOptional: true,
    disableReverseLookup: true,
    size: largestMailBytes,
    onData(stream, session, done) {
      const { mailFrom, rcptTo } = session.envelope;
      const envelope = {
        from: mailFrom ? mailFrom.address : '',
        to: rcptTo.map((recipient) => recipient.address),
      };
      readStream(stream)
        .then((raw) => {
          if (stream.sizeExceeded) throw refusal(552, `A mail may have ${largestMailBytes} bytes.`);
          return mails.keep(raw, envelope);
        })
        .then(() => done(), done);
    },
  });
}

const html = (body, status = 200) => ({ status, type: 'text/html; charset=utf-8', body });
const json = (value) => ({
  status: 200,
  type: 'application/json; charset=utf-8',
  body: JSON.stringify(value),
});

function attachmentReply(mail, index) {
  const attachment = mail?.attachments[index];
  if (!attachment) return html(missingPage(), 404);
  return {
    status: 200,
    type: mediaType.test(attachment.type) ? attachment.type : 'application/octet-stream',
    body: Buffer.from(attachment.content, 'base64'),
    disposition: `attachment; filename*=UTF-8''${encodeURIComponent(attachment.name.toWellFormed())}`,
  };
}

function reply(mails, path) {
  if (!URL.canParse(path, `http://${host}`)) return html(missingPage(), 404);
  const url = new URL(path, `http://${host}`);
  const address = url.searchParams.get('to')?.trim() ?? '';
  if (url.pathname === '/') return html(listPage(mails.list(address), address));
  if (url.pathname === '/messages.json')
    return json(mails.list(address).map(({ id }) => mails.find(id)));
  const [, id, index] =
    /^\/messages\/([0-9a-f-]+)(?:\/attachments\/(\d+))?$/.exec(url.pathname) ?? [];
  const mail = id && mails.find(id);
  if (index !== undefined) return attachmentReply(mail, Number(index));
  return mail ? html(mailPage(mail)) : html(missingPage(), 404);
}

function makePageServer(mails) {
  return createServer((request, response) => {
    // A page elsewhere that points its own name at this computer must not read the mail.
    const isLocal = /^(127\.0\.0\.1|localhost)(:\d+)?$/.test(request.headers.host ?? '');
    const isRead = request.method === 'GET' || request.method === 'HEAD';
    const { status, type, body, disposition } =
      isLocal && isRead ? reply(mails, request.url) : html(missingPage(), isLocal ? 405 : 421);
    response.writeHead(status, {
      'content-type': type,
      'content-security-policy': policy,
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'no-referrer',
      'cache-control': 'no-store',
      ...(disposition && { 'content-disposition': disposition }),
    });
    response.end(request.method === 'HEAD' ? undefined : body);
  });
}

const listening = (server, port) =>
  new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, () => resolve());
  });

/**
 * Takes every mail of the demonstration and shows it on a page; sends none on.
 *
 * @param options - `folder` is where the newest 500 are kept.
 */
export async function startMailSink({ smtpPort, pagePort, folder }) {
  const mails = openKeptMails(folder);
  const smtp = makeSmtpServer(mails);
  // A client that goes away in the middle of a mail must not end the sink.
  smtp.on('error', (error) => console.error(`mail: ${error.message}`));
  const pageServer = makePageServer(mails);
  await listening(smtp.server, smtpPort);
  await listening(pageServer, pagePort);
  const stop = () =>
    new Promise((resolve) => {
      pageServer.closeAllConnections();
      pageServer.close(() => smtp.close(resolve));
    });
  return {
    smtpUrl: `smtp://${host}:${smtp.server.address().port}`,
    pageUrl: `http://${host}:${pageServer.address().port}`,
    stop,
  };
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const sink = await startMailSink({
    smtpPort: Number(process.env.SINK_SMTP_PORT ?? 0),
    pagePort: Number(process.env.SINK_PAGE_PORT ?? 0),
    folder: process.env.SINK_FOLDER ?? '.data/mail',
  });
  for (const signal of ['SIGTERM', 'SIGINT']) {
    process.once(signal, () => void sink.stop().then(() => process.exit(0)));
  }
  console.log(`ready ${sink.pageUrl} ${sink.smtpUrl}`);
}
