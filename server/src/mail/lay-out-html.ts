import { sender } from './lay-out-text.ts';
import type { WrittenLetter } from './letter.ts';

/** Content id of the picture beside the name: it travels in the mail, nothing is fetched. */
export const MARK_ID = 'mark@ferrule';

const sans = "font-family:'Source Sans 3','Segoe UI',Helvetica,Arial,sans-serif";
const serif = "font-family:'Merriweather',Georgia,'Times New Roman',serif";
const table = 'role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0"';

const escape = (text: string) =>
  text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replaceAll("'", '&#39;');

const styles = `:root{color-scheme:light dark;supported-color-schemes:light dark}
body{margin:0;padding:0}img{border:0;display:block}a{color:#85401D}
@media (max-width:620px){.wrap{width:100%!important}.pad{padding-left:18px!important;padding-right:18px!important}.h1{font-size:30px!important;line-height:36px!important}.out{padding:0!important}.tc{display:block!important;width:auto!important;border-left:0!important;border-top:1px solid #231F1A!important}.tc0{border-top:0!important}}
@media (prefers-color-scheme:dark){.bg{background:#12110F!important}.sh{background:#1B1916!important}.in{background:#24211D!important}.tx{color:#F0EADF!important}.t2{color:#C6BDAE!important}.t3{color:#A89E8E!important}.fr,.tc,.ln{border-color:#9F9585!important}.hr{border-color:#37322C!important}.vd{color:#82D2BE!important}.bt{background:#D18A5A!important}.btx{color:#1B1009!important}a{color:#EAAF86}.lnk{color:#EAAF86!important}}`;

/** Addresses in the text, made to lead there. */
const linked = (text: string) =>
  escape(text).replaceAll(
    /https?:\/\/[^\s<>]+[^\s<>.,;:]/g,
    (url) => `<a href="${url}" style="color:#85401D" class="lnk">${url}</a>`,
  );

const paragraph = (text: string) =>
  `<p style="margin:0 0 14px;${sans};font-size:17px;line-height:26px;color:#231F1A" class="tx">${linked(text)}</p>`;

const masthead = (school: string) =>
  `<tr><td class="pad ln" style="padding:16px 32px 14px;border-bottom:1px solid #231F1A"><table ${table}><tr><td width="52"><img src="cid:${MARK_ID}" width="40" height="18" alt="" style="width:40px;height:18px"></td><td style="${serif};font-weight:bold;font-size:20px;line-height:24px;color:#231F1A" class="tx">Ferrule</td><td align="right" style="${sans};font-size:14px;line-height:20px;color:#675E50" class="t3">${escape(school)}</td></tr></table></td></tr>`;

function title({ kicker, heading, tone }: WrittenLetter): string {
  const colour = tone === 'good' ? 'color:#135F51" class="h1 vd' : 'color:#231F1A" class="h1 tx';
  return `<tr><td class="pad" style="padding:28px 32px 20px">
<p style="margin:0 0 8px;${sans};font-size:15px;line-height:20px;color:#675E50" class="t3">${escape(kicker)}</p>
<h1 style="margin:0;${serif};font-weight:bold;font-size:36px;line-height:42px;letter-spacing:-.5px;${colour}">${escape(heading)}</h1></td></tr>`;
}

function factCell(fact: readonly [string, string], isFirst: boolean, widthPercent: number): string {
  const place = isFirst
    ? 'class="tc tc0 pad" style="padding:9px 12px 10px 32px"'
    : 'class="tc pad" style="padding:9px 12px 10px 14px;border-left:1px solid #231F1A"';
  return `<td valign="top" width="${widthPercent}%" ${place}><span style="${sans};font-size:13px;line-height:16px;color:#675E50" class="t3">${escape(fact[0])}</span><br><span style="${sans};font-size:16px;line-height:21px;font-weight:bold;color:#231F1A" class="tx">${escape(fact[1])}</span></td>`;
}

function titleRow({ facts }: WrittenLetter): string {
  if (facts.length === 0) {
    return '<tr><td style="border-top:1px solid #231F1A;font-size:0;line-height:0" class="ln">&nbsp;</td></tr>';
  }
  const widthPercent = Math.floor(100 / facts.length);
  const cells = facts.map((fact, index) => factCell(fact, index === 0, widthPercent)).join('');
  return `<tr><td style="border-top:1px solid #231F1A;border-bottom:1px solid #231F1A" class="ln"><table ${table}><tr>${cells}</tr></table></td></tr>`;
}

const button = ({ label, url }: WrittenLetter['button']) =>
  `<table role="presentation" cellpadding="0" cellspacing="0" border="0" style="margin:6px 0 18px"><tr><td bgcolor="#9C4F26" class="bt" style="border-radius:2px;background:#9C4F26"><a href="${escape(url)}" style="display:inline-block;padding:13px 22px;${sans};font-size:17px;line-height:20px;font-weight:bold;color:#FFFFFF;text-decoration:none" class="btx">${escape(label)}</a></td></tr></table>`;

type Row = readonly [label: string, value: string];

function row([label, value]: Row, look: 'line' | 'total'): string {
  const rule = look === 'line' ? '#D0C7B5' : '#231F1A';
  const words =
    look === 'line'
      ? 'color:#544C40" class="t2 hr'
      : 'font-weight:bold;color:#231F1A" class="tx ln';
  return `<tr><td style="padding:9px 12px 9px 0;border-bottom:1px solid ${rule};${sans};font-size:16px;line-height:22px;${words}">${escape(label)}</td><td align="right" style="padding:9px 0;border-bottom:1px solid ${rule};${sans};font-size:16px;line-height:22px;font-weight:bold;color:#231F1A;white-space:nowrap" class="tx ${look === 'line' ? 'hr' : 'ln'}">${escape(value)}</td></tr>`;
}

function rows(lines: WrittenLetter['table']): string {
  if (!lines) return '';
  const body = [...lines.rows.map((one) => row(one, 'line')), row(lines.total, 'total')].join('');
  return `<h2 style="margin:0 0 8px;${serif};font-weight:bold;font-size:19px;line-height:26px;color:#231F1A" class="tx">${escape(lines.title)}</h2><table ${table} style="border-collapse:collapse;margin:0 0 20px;border-top:2px solid #231F1A" class="ln">${body}</table>`;
}

const foot = (letter: WrittenLetter) =>
  `<tr><td class="pad in ln" style="padding:16px 32px 18px;background:#F5F2EB;border-top:2px solid #231F1A"><p style="margin:0;${sans};font-size:14px;line-height:21px;color:#544C40" class="t2">${escape(letter.reason)} There are no tracking pictures in this mail.<br>${escape(sender(letter.school))}</p></td></tr>`;

/** The letter as HTML: one table of 600 px, every style inline, dark where the reader's client is. */
export function layOutHtml(letter: WrittenLetter): string {
  return `<!doctype html>
<html lang="en-GB" xmlns="http://www.w3.org/1999/xhtml"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1"><meta name="color-scheme" content="light dark"><meta name="supported-color-schemes" content="light dark"><meta name="format-detection" content="telephone=no,date=no,address=no,email=no"><title>${escape(letter.subject)}</title>
<style>
${styles}
</style></head>
<body style="margin:0;padding:0;background:#EDE9E0" class="bg">
<div style="display:none;max-height:0;overflow:hidden;font-size:1px;line-height:1px;color:#EDE9E0">${escape(letter.preview)}</div>
<table ${table} bgcolor="#EDE9E0" class="bg" style="background:#EDE9E0"><tr><td align="center" class="out" style="padding:28px 12px">
<table role="presentation" width="600" cellpadding="0" cellspacing="0" border="0" class="wrap sh fr" style="width:600px;background:#FCFBF8;border:2px solid #231F1A;border-collapse:separate">
${masthead(letter.school)}
${title(letter)}
${titleRow(letter)}
<tr><td class="pad" style="padding:24px 32px 14px">${letter.before.map(paragraph).join('')}${button(letter.button)}${rows(letter.table)}${letter.after.map(paragraph).join('')}</td></tr>
${foot(letter)}
</table></td></tr></table></body></html>
`;
}
