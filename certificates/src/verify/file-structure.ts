import { dictionaryHead, numberInTail, reservedContents } from '../signature-place.ts';
import { malformed, Refusal } from './fault.ts';

/** A signed file taken apart; nothing in it is believed yet. */
export interface SignedFile {
  number: string;
  /** All of the file but the signature itself. */
  signedOctets: Uint8Array<ArrayBuffer>;
  /** The signature with the zeros that fill its place. */
  signatureOctets: Uint8Array;
}

/**
 * Finds the one signature and makes sure that it covers everything else in the file.
 *
 * @throws {Refusal} naming what is wrong.
 */
export function readSignedFile(file: Uint8Array): SignedFile {
  const text = asText(file);
  if (!text.startsWith('%PDF-')) {
    throw new Refusal('not-a-pdf', 'This file is not a PDF. Drop the certificate as it was sent.');
  }
  const range = readRange(text);
  requireSingleRevision(text, range);
  const gap = text.slice(range.gapStart, range.gapEnd);
  const number = readDictionary(text, range);
  if (gap.length !== reservedContents.length || !/^<[0-9a-f]*>$/.test(gap)) {
    throw new Refusal(
      'added-to',
      'Something was put into the place kept for the signature, which the signature does not cover.',
    );
  }
  const signedOctets = new Uint8Array(file.length - gap.length);
  signedOctets.set(file.subarray(0, range.gapStart));
  signedOctets.set(file.subarray(range.gapEnd), range.gapStart);
  return { number, signedOctets, signatureOctets: fromHex(gap.slice(1, -1)) };
}

/** The number the file claims, whatever else is wrong with it. */
export function claimedNumber(file: Uint8Array): string | null {
  return /\/Reason \(Certificate ([0-9A-Z-]{14})\)/.exec(asText(file))?.[1] ?? null;
}

interface Range {
  gapStart: number;
  gapEnd: number;
  tailLength: number;
}

function readRange(text: string): Range {
  const places = countOf(text, '/ByteRange');
  if (places === 0) {
    throw new Refusal(
      'not-signed',
      'This PDF carries no signature: it was printed or saved anew by another program, or cut short. ' +
        'Drop the file as it was sent.',
    );
  }
  if (places > 1) {
    throw new Refusal('added-to', 'This PDF was signed again after it was issued.');
  }
  const numbers = /^\/ByteRange \[0 (\d{1,8}) (\d{1,8}) (\d{1,8})\]/.exec(
    text.slice(text.indexOf('/ByteRange')).slice(0, 100),
  );
  if (!numbers) throw malformed('what it covers is not written as we write it.');
  const [gapStart = 0, gapEnd = 0, tailLength = 0] = numbers.slice(1).map(Number);
  return { gapStart, gapEnd, tailLength };
}

function requireSingleRevision(text: string, { gapStart, gapEnd, tailLength }: Range): void {
  const surplus = text.length - gapEnd - tailLength;
  if (surplus > 0) {
    throw new Refusal(
      'added-to',
      `The certificate was signed, but ${bytes(surplus)} added after that. Drop the file as it was sent.`,
    );
  }
  if (surplus < 0) {
    throw new Refusal(
      'changed-after-signing',
      `The file is cut short: ${bytes(-surplus)} missing. Drop the file as it was sent.`,
    );
  }
  if (gapStart >= gapEnd || gapEnd > text.length) {
    throw malformed('what it covers does not fit the file.');
  }
  const trailer = text.slice(text.lastIndexOf('trailer'));
  const isSingle =
    countOf(text, 'startxref') === 1 &&
    countOf(text, '%%EOF') === 1 &&
    /\nstartxref\n\d{1,8}\n%%EOF\n?$/.test(text.slice(-60)) &&
    !/\/Prev|\/XRefStm/.test(trailer);
  if (!isSingle) {
    throw new Refusal('added-to', 'The file holds more than one version of the certificate.');
  }
}

// The signature's dictionary must be ours to the byte, in one object around the gap.
function readDictionary(text: string, { gapStart, gapEnd, tailLength }: Range): string {
  const head = dictionaryHead(`[0 ${gapStart} ${gapEnd} ${tailLength}]`);
  const before = text.slice(0, gapStart);
  const number = numberInTail(text.slice(gapEnd, gapEnd + 4000));
  const isOurs =
    before.endsWith(head) && /\n\d{1,6} 0 obj\n$/.test(before.slice(0, -head.length).slice(-20));
  if (!isOurs || number === null) {
    throw malformed('its dictionary is not written as we write it.');
  }
  return number;
}

function bytes(count: number): string {
  return count === 1 ? 'one byte is' : `${count} bytes are`;
}

function countOf(text: string, part: string): number {
  return text.split(part).length - 1;
}

/** One character an octet, so that positions agree. */
function asText(file: Uint8Array): string {
  return new TextDecoder('latin1').decode(file);
}

function fromHex(hex: string): Uint8Array {
  const octets = new Uint8Array(hex.length / 2);
  for (let at = 0; at < octets.length; at += 1) {
    octets[at] = Number.parseInt(hex.slice(at * 2, at * 2 + 2), 16);
  }
  return octets;
}
