import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { mkdtempSync, rmSync } from 'node:fs';
import { request } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';
import { startMailSink } from './sink.mjs';

const folder = mkdtempSync(join(tmpdir(), 'ferrule-mail-'));
const start = () => startMailSink({ smtpPort: 0, pagePort: 0, folder });

async function send(sink, mail) {
  const transport = createTransport(sink.smtpUrl, { ignoreTLS: true });
  await transport.sendMail({ from: 'School <school@example.example>', ...mail });
  transport.close();
}

const read = async (url) => (await fetch(url)).text();

const statusAs = (url, host) =>
  new Promise((resolve, reject) => {
    request(url, { headers: { host } }, (response) => {
      response.resume();
      resolve(response.statusCode);
    })
      .on('error', reject)
      .end();
  });

let sink;
beforeAll(async () => {
  sink = await start();
});
afterAll(async () => {
  await sink.stop();
  rmSync(folder, { recursive: true });
});

describe('the mail sink', () => {
  it('lists what was sent, newest first, and by whom it was for', async () => {
    await send(sink, { to: 'a@example.example', subject: 'First', text: 'Hello' });
    await send(sink, {
      to: 'b@example.example',
      subject: 'Second',
      text: 'Hello',
      html: '<p>Hello',
    });
    const subjects = async (query) =>
      (await (await fetch(`${sink.pageUrl}/messages.json${query}`)).json()).map(
        (mail) => mail.subject,
      );
    expect(await subjects('')).toEqual(['Second', 'First']);
    expect(await subjects('?to=A@example.example')).toEqual(['First']);
  });

  it('shows a mail without letting it act: all of it escaped, its HTML in a closed frame', async () => {
    const attack = '<script>alert(1)</script>';
    await send(sink, { to: 'c@example.example', subject: attack, text: attack, html: attack });
    const [{ id }] = await (
      await fetch(`${sink.pageUrl}/messages.json?to=c@example.example`)
    ).json();
    const page = await read(`${sink.pageUrl}/messages/${id}`);
    expect(page).not.toContain('<script');
    expect(page).toContain('sandbox="allow-popups allow-popups-to-escape-sandbox"');
  });

  it('gives an attachment back byte for byte', async () => {
    const content = Buffer.from([0, 255, 10, 13, 37, 80]);
    const attachments = [{ filename: 'Zoë.pdf', content, contentType: 'application/pdf' }];
    await send(sink, { to: 'd@example.example', subject: 'File', text: 'Here', attachments });
    const [{ id }] = await (
      await fetch(`${sink.pageUrl}/messages.json?to=d@example.example`)
    ).json();
    const reply = await fetch(`${sink.pageUrl}/messages/${id}/attachments/0`);
    expect(reply.headers.get('content-type')).toBe('application/pdf');
    expect(Buffer.from(await reply.arrayBuffer())).toEqual(content);
  });

  it('answers only to this computer by its own names', async () => {
    expect(await statusAs(sink.pageUrl, 'elsewhere.example')).toBe(421);
    expect(await statusAs(`${sink.pageUrl}/messages/nothing`, 'localhost')).toBe(404);
  });

  it('still has the mail after a restart', async () => {
    const before = await read(`${sink.pageUrl}/messages.json`);
    await sink.stop();
    sink = await start();
    expect(await read(`${sink.pageUrl}/messages.json`)).toBe(before);
  });
});
