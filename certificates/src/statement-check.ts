import { type CertificateStatement } from './certificate.ts';
import { StatementInvalid } from './errors.ts';
import { readCertificateNumber } from './number.ts';

const longest = 200;

/**
 * The statement with every text in NFC and single spaces.
 *
 * @throws {StatementInvalid} naming the field, the rule and the remedy.
 */
export function checkStatement(statement: CertificateStatement): CertificateStatement {
  const { scheme, issuer } = statement;
  return {
    number: checkNumber(statement.number),
    holderName: checkName(statement.holderName),
    scheme: {
      slug: checkText('scheme reference', scheme.slug),
      revision: checkText('scheme revision', scheme.revision),
      title: checkText('title of the scheme', scheme.title),
    },
    scope: checkList('scope', statement.scope, 1),
    limits: checkList('limits', statement.limits, 0),
    howSat: checkText('way of sitting', statement.howSat),
    ...checkDates(statement),
    issuer: {
      name: checkText('name of the certifying body', issuer.name),
      address: checkText('address of the certifying body', issuer.address),
    },
    registerUrl: checkUrl(statement.registerUrl),
    registerPage: checkText('register address', statement.registerPage),
  };
}

/** @throws {StatementInvalid} for a name that may not be printed. */
export function checkName(holderName: string): string {
  return checkText('holder’s name', holderName);
}

function checkNumber(number: string): string {
  const reading = readCertificateNumber(number);
  if (!reading.ok) throw new StatementInvalid(`Certificate number ${number}: ${reading.reason}`);
  if (reading.number !== number) {
    throw new StatementInvalid(`Write the certificate number ${number} as ${reading.number}.`);
  }
  return number;
}

function checkText(what: string, text: string): string {
  const tidy = text.normalize('NFC').replace(/\s/g, ' ').replace(/ +/g, ' ').trim();
  if (tidy === '') throw new StatementInvalid(`The ${what} is empty; a certificate must state it.`);
  if (tidy.length > longest) {
    throw new StatementInvalid(
      `The ${what} has ${tidy.length} characters; a certificate holds ${longest}. Shorten it.`,
    );
  }
  const hidden = /[\p{Cc}\p{Cf}\p{Co}\p{Cs}]/u.exec(tidy)?.[0];
  if (hidden !== undefined) {
    const point = hidden.codePointAt(0)?.toString(16).toUpperCase().padStart(4, '0');
    throw new StatementInvalid(
      `The ${what} contains the invisible character U+${point}, which may not be printed. Remove it.`,
    );
  }
  return tidy;
}

function checkList(what: string, entries: string[], fewest: number): string[] {
  if (entries.length < fewest) {
    throw new StatementInvalid(`The ${what} is empty; a certificate must state it.`);
  }
  return entries.map((entry) => checkText(what, entry));
}

function checkDates({
  issuedOn,
  expiresOn,
}: CertificateStatement): Pick<CertificateStatement, 'issuedOn' | 'expiresOn'> {
  for (const date of [issuedOn, expiresOn]) {
    const instant = new Date(`${date}T00:00:00Z`);
    if (Number.isNaN(instant.getTime()) || instant.toISOString().slice(0, 10) !== date) {
      throw new StatementInvalid(`${date} is not a date; write it as 2026-11-03.`);
    }
  }
  if (expiresOn <= issuedOn) {
    throw new StatementInvalid(
      `The certificate would expire on ${expiresOn}, not after its issue on ${issuedOn}.`,
    );
  }
  return { issuedOn, expiresOn };
}

function checkUrl(url: string): string {
  if (!/^https?:\/\/[!-~]{1,400}$/.test(url)) {
    throw new StatementInvalid(
      `The register link ${url} cannot be drawn as a code; use an http or https address in ASCII.`,
    );
  }
  return url;
}
