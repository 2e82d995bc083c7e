import { PDFDocument } from 'pdf-lib';
import { type CertificateFonts } from '../certificate.ts';
import { CertificateError } from '../errors.ts';
import { checkName } from '../statement-check.ts';
import { embedFonts } from './fonts.ts';
import { fitName } from './holder.ts';
import { Pen } from './pen.ts';

/**
 * Whether a name can be printed on a certificate, asked when its holder confirms it: a name that
 * cannot must not come to light only after the paper was passed.
 *
 * @returns the name as it will be printed, or what to change in it.
 */
export async function checkHolderName(
  holderName: string,
  fonts: CertificateFonts,
): Promise<{ ok: true; name: string } | { ok: false; reason: string }> {
  try {
    const name = checkName(holderName);
    const type = await embedFonts(await PDFDocument.create(), fonts, name);
    fitName(new Pen(type), name);
    return { ok: true, name };
  } catch (error) {
    if (error instanceof CertificateError) return { ok: false, reason: error.message };
    throw error;
  }
}
