import {
  type PDFDocument,
  PDFHexString,
  PDFInvalidObject,
  PDFName,
  type PDFPage,
  PDFString,
} from 'pdf-lib';
import { type CertificateStatement } from '../certificate.ts';
import { dictionaryTail, reservedContents, reservedHead } from '../signature-place.ts';

const hiddenPrintedLocked = 2 | 4 | 128;

/**
 * Reserves the place `signPdf` fills: an invisible signature field whose dictionary certifies the
 * file and allows no change (DocMDP level 1, ISO 32000-1, 12.8.2.2).
 */
export function reserveSignature(
  document: PDFDocument,
  page: PDFPage,
  statement: CertificateStatement,
): void {
  const { context } = document;
  const signer = {
    nameHex: PDFHexString.fromText(statement.issuer.name).asString(),
    number: statement.number,
  };
  const dictionary = reservedHead + reservedContents + dictionaryTail(signer);
  // Written byte for byte: a dictionary object could be moved, compressed or spelt otherwise.
  const signature = context.register(PDFInvalidObject.of(Buffer.from(dictionary, 'latin1')));
  const field = context.register(
    context.obj({
      Type: 'Annot',
      Subtype: 'Widget',
      FT: 'Sig',
      T: PDFString.of('Signature'),
      F: hiddenPrintedLocked,
      Rect: [0, 0, 0, 0],
      P: page.ref,
      V: signature,
    }),
  );
  page.node.set(PDFName.of('Annots'), context.obj([field]));
  const { catalog } = document;
  catalog.set(PDFName.of('AcroForm'), context.obj({ Fields: [field], SigFlags: 3 }));
  catalog.set(PDFName.of('Perms'), context.obj({ DocMDP: signature }));
}
