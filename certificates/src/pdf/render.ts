import { PDFDocument, PDFHexString, PDFName, type PDFPage } from 'pdf-lib';
import { type CertificateFonts, type CertificateStatement } from '../certificate.ts';
import { checkStatement } from '../statement-check.ts';
import { drawAssessed } from './assessed.ts';
import { embedFonts, type TypeSetter } from './fonts.ts';
import { drawHead, drawHolder } from './holder.ts';
import { Pen, sheetHeight, sheetWidth } from './pen.ts';
import { ringForms } from './ring.ts';
import { drawSheet } from './sheet.ts';
import { reserveSignature } from './signature-field.ts';
import { addStructure } from './structure.ts';
import { drawFoot } from './title-block.ts';

/** Every letter of the fixed words; the statement brings its own. */
const fixedLetters = ' 0123456789-,.;’abcdefghijklmnopqrstuvwxyzABCDEFGHIJKLMNOPQRSTUVWXYZ';

/**
 * Draws a certificate on one sheet of A4 with a place reserved for its signature: tagged, searchable,
 * and the same bytes for the same statement and fonts.
 *
 * @param fonts - the bytes of `fontFiles`.
 * @throws {StatementInvalid | StatementTooLong | CharacterNotInFonts} naming what cannot be printed.
 */
export async function renderCertificate(
  statement: CertificateStatement,
  fonts: CertificateFonts,
): Promise<Uint8Array> {
  const checked = checkStatement(statement);
  const document = await PDFDocument.create({ updateMetadata: false });
  const page = document.addPage([sheetWidth * 0.75, sheetHeight * 0.75]);
  describe(document, checked);
  const type = await embedFonts(document, fonts, lettersOf(checked));
  const pen = new Pen(type);

  drawSheet(pen);
  const head = drawHead(pen, checked);
  const holder = drawHolder(pen, checked);
  const assessed = drawAssessed(pen, checked, holder.bottom + 20);
  const foot = drawFoot(pen, checked);

  addContents(document, page, { pen, type });
  addStructure(document, page, [head, ...holder.elements, ...assessed, ...foot]);
  reserveSignature(document, page, checked);
  return document.save({
    useObjectStreams: false,
    addDefaultPage: false,
    updateFieldAppearances: false,
  });
}

function lettersOf(statement: CertificateStatement): string {
  const letters = [...JSON.stringify(statement), ...fixedLetters];
  return [...new Set(letters)].sort().join('');
}

function describe(document: PDFDocument, statement: CertificateStatement): void {
  const issued = new Date(`${statement.issuedOn}T00:00:00Z`);
  document.setTitle(
    `Certificate ${statement.number}: ${statement.holderName}, ${statement.scheme.title}`,
    { showInWindowTitleBar: true },
  );
  document.setAuthor(statement.issuer.name);
  document.setSubject(`${statement.scheme.slug}, revision ${statement.scheme.revision}`);
  document.setCreator('Ferrule');
  document.setProducer('Ferrule');
  document.setLanguage('en-GB');
  document.setCreationDate(issued);
  document.setModificationDate(issued);
  const identifier = PDFHexString.of(Buffer.from(statement.number).toString('hex'));
  document.context.trailerInfo.ID = document.context.obj([identifier, identifier]);
}

function addContents(
  document: PDFDocument,
  page: PDFPage,
  { pen, type }: { pen: Pen; type: TypeSetter },
): void {
  const { context } = document;
  for (const [face, ref] of type.fontRefs()) page.node.setFontDictionary(PDFName.of(face), ref);
  for (const { name, contents, bound } of ringForms()) {
    const form = context.flateStream(contents, {
      Type: 'XObject',
      Subtype: 'Form',
      BBox: [-bound, -bound, bound, bound],
    });
    page.node.setXObject(PDFName.of(name), context.register(form));
  }
  page.node.set(PDFName.of('Contents'), context.register(context.flateStream(pen.contents())));
}
