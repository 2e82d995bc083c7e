import type { FastifyRequest } from 'fastify';
import { InvalidRequest } from '../problems/common.errors.ts';

const FIELD = 'file';
const TOO_LARGE = 413;

/**
 * The one file of a multipart request; its size is limited where the server is set up.
 *
 * @throws {InvalidRequest} when there is none.
 */
export async function readUpload(request: FastifyRequest): Promise<Buffer> {
  if (!request.isMultipart()) throw notAFile();
  try {
    const part = await request.file();
    if (part?.fieldname === FIELD) return await part.toBuffer();
    part?.file.resume();
  } catch (error) {
    if ((error as { statusCode?: unknown }).statusCode === TOO_LARGE) throw error;
  }
  throw notAFile();
}

const notAFile = () =>
  new InvalidRequest([
    {
      pointer: `#/${FIELD}`,
      detail: `Send one file as multipart/form-data in the field “${FIELD}”.`,
    },
  ]);
