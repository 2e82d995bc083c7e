import type { FastifyRequest } from 'fastify';
import { InvalidRequest } from '../problems/common.errors.ts';

/**
 * The database keeps no text with a null character in it, so none is let in anywhere.
 *
 * @throws {InvalidRequest}
 */
export function refuseNullCharacters({ body, params, query }: FastifyRequest): void {
  const isText = body === null || body === undefined || typeof body === 'object';
  const said = JSON.stringify([isText ? body : null, params, query]);
  if (!said.includes('\\u0000')) return;
  throw new InvalidRequest([{ pointer: '#', detail: 'Null characters cannot be kept as text.' }]);
}
