import { afterAll, describe, expect, it } from 'vitest';
import { fonts, statement } from '../../test/fixtures.ts';
import { Bench } from '../../test/outside.ts';
import { type CertificateStatement } from '../certificate.ts';
import { renderCertificate } from './render.ts';

const bench = new Bench();
afterAll(() => bench.remove());

/** The line of the name between “This certifies that” and “has passed …”. */
const nameBox = { x: 60, y: 155, width: 674, height: 92 };

function render(changes: Partial<CertificateStatement> = {}): Promise<Uint8Array> {
  return renderCertificate({ ...statement, ...changes }, fonts);
}

function textOf(pdf: Uint8Array): string {
  bench.write('text.pdf', pdf);
  return bench.run('pdftotext', '-raw', 'text.pdf', '-').result.replace(/\s+/g, ' ');
}

describe('drawing a certificate', () => {
  it('gives the same bytes for the same statement', async () => {
    expect(Buffer.from(await render()).equals(Buffer.from(await render()))).toBe(true);
  });

  it('states everything a certificate must, in the file and on the page', async () => {
    const pdf = await render();
    const text = textOf(pdf);
    const { number, scheme, issuer, howSat, scope, limits, registerPage } = statement;
    for (const part of [
      ...[number, scheme.slug, scheme.title, issuer.name, issuer.address, howSat, registerPage],
      ...[...scope, ...limits, 'Priya Vandermeer', '3 November 2026', '3 November 2029'],
    ]) {
      expect(text.replaceAll(' ', '')).toContain(part.replaceAll(' ', ''));
    }
    expect(text).not.toMatch(/signed by|assessor/i);

    const page = bench.draw(pdf);
    expect(page.ink(nameBox)).toBeGreaterThan(0.1);
    // Scheme, number, dates, body and check text are there as pixels; the ground is not dark.
    expect(page.ink({ x: 130, y: 285, width: 534, height: 45 })).toBeGreaterThan(0.1);
    expect(page.ink({ x: 396, y: 908, width: 130, height: 20 })).toBeGreaterThan(0.1);
    expect(page.ink({ x: 396, y: 952, width: 120, height: 20 })).toBeGreaterThan(0.1);
    expect(page.ink({ x: 396, y: 1040, width: 180, height: 20 })).toBeGreaterThan(0.1);
    expect(page.ink({ x: 50, y: 100, width: 200, height: 20 })).toBe(0);
  });

  it('draws a code that reads as the register link', async () => {
    bench.draw(await render(), 150);
    const { result } = bench.run('zbarimg', '--quiet', '--raw', 'page.pgm');
    expect(result.trim()).toBe(statement.registerUrl);
  });

  it('is sound, titled and tagged for those who listen to it', async () => {
    bench.write('sheet.pdf', await render());
    expect(bench.run('qpdf', '--check', 'sheet.pdf')).toMatchObject({ status: 0 });
    const { said } = bench.run('pdfinfo', 'sheet.pdf');
    expect(said).toMatch(/Tagged: +yes/);
    expect(said).toContain('Certificate HQ7K-2M4T-9XWD: Priya Vandermeer, Auxiliary DC systems');
    expect(said).toContain('(A4)');
    const { said: read } = bench.run('pdfinfo', '-struct-text', 'sheet.pdf');
    const order = [
      'This certifies',
      'Priya',
      'Auxiliary DC systems inst',
      'Cable',
      'How it',
      'Cert',
    ];
    const places = order.map((part) => read.indexOf(part));
    expect(places).toEqual(places.toSorted((one, other) => one - other));
    expect(places).not.toContain(-1);
  });

  it.each([
    ['Zoë Nguyễn-Łukasiewicz', 'Zoe Nguyen-Lukasiewicz'],
    ['Hemi Tāwhiri-Boyd', 'Hemi Tawhiri-Boyd'],
  ])('draws every letter and accent of %s', async (name, plain) => {
    const pdf = await render({ holderName: name });
    expect(textOf(pdf)).toContain(name);
    const withAccents = bench.draw(pdf);
    const without = bench.draw(await render({ holderName: plain }));
    const ratio = withAccents.inkedWidth(nameBox) / without.inkedWidth(nameBox);
    // No letter is lost, and the accents are ink that the plain name does not have.
    expect(ratio).toBeGreaterThan(0.98);
    expect(ratio).toBeLessThan(1.02);
    expect(withAccents.ink(nameBox)).toBeGreaterThan(without.ink(nameBox) * 1.005);
  });

  it('composes a name typed with separate accents, and draws those that have no single letter', async () => {
    const composed = await render({ holderName: 'Zoë Nguyễn' });
    const typed = await render({ holderName: 'Zoë Nguyễn'.normalize('NFD') });
    expect(Buffer.from(typed).equals(Buffer.from(composed))).toBe(true);

    const lone = bench.draw(await render({ holderName: 'M\u0304aia' }));
    const plain = bench.draw(await render({ holderName: 'Maia' }));
    expect(lone.ink(nameBox)).toBeGreaterThan(plain.ink(nameBox) * 1.01);
    expect(Math.abs(lone.inkedWidth(nameBox) - plain.inkedWidth(nameBox))).toBeLessThan(2);
  });

  it('borrows letters its text face lacks', async () => {
    const pdf = await render({ holderName: 'Ελένη Петрова' });
    expect(textOf(pdf)).toContain('Ελένη Петрова');
    expect(bench.draw(pdf).inkedWidth(nameBox)).toBeGreaterThan(300);
  });

  it('sets one name alone large, and a long one on two lines inside the frame', async () => {
    const one = bench.draw(await render({ holderName: 'Ema' }));
    expect(one.ink(nameBox)).toBeGreaterThan(0.02);

    const long = await render({ holderName: 'Maria Aurélia Conceição dos Santos e Albuquerque' });
    const page = bench.draw(long);
    const firstLine = page.inkedWidth({ ...nameBox, height: 42 });
    const secondLine = page.inkedWidth({ ...nameBox, y: 207, height: 42 });
    expect(firstLine).toBeGreaterThan(300);
    expect(secondLine).toBeGreaterThan(300);
    const frameGaps = [40, 725].map((x) => page.ink({ x: x + 4, y: 160, width: 20, height: 90 }));
    expect(frameGaps).toEqual([0, 0]);
  });

  it('gives the ring less room when there is more to say, and refuses what cannot be read', async () => {
    const scope = Array.from({ length: 7 }, (_, index) => `Kind of work number ${index + 1}`);
    expect(textOf(await render({ scope }))).toContain('number 7');
    await expect(
      render({ scope: Array.from({ length: 40 }, () => 'One more kind of work') }),
    ).rejects.toThrow('Scope (40 entries), limits (2) and the way of sitting are more than');
    await expect(render({ holderName: 'Abcdefghijklmnop'.repeat(8) })).rejects.toThrow(
      'The holder’s name “Abcdefghijkl',
    );
  });

  it.each<[string, Partial<CertificateStatement>, string]>([
    ['a letter no face has', { holderName: 'Wáng 王' }, 'no letter for “王” (U+738B)'],
    ['a hidden turn of direction', { holderName: 'Ada\u202Eevol' }, 'invisible character U+202E'],
    ['no name', { holderName: '  ' }, 'holder’s name is empty'],
    ['no scope', { scope: [] }, 'scope is empty'],
    ['a mistyped number', { number: 'HQ7K-2M4T-9XDW' }, 'two are swapped'],
    ['a number in another form', { number: 'hq7k2m4t9xwd' }, 'as HQ7K-2M4T-9XWD'],
    ['no date', { issuedOn: '2026-02-30' }, '2026-02-30 is not a date'],
    ['an end before the start', { expiresOn: '2026-11-03' }, 'not after its issue'],
    ['a link that is none', { registerUrl: 'javascript:0' }, 'register link javascript:0'],
  ])('refuses %s', async (_, changes, words) => {
    await expect(render(changes)).rejects.toThrow(words);
  });
});
