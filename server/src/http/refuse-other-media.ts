import type { FastifyRequest } from 'fastify';
import { InvalidRequest } from '../problems/common.errors.ts';

const TAKEN = /^(application\/json|multipart\/form-data)\s*(;|$)/i;

/**
 * Bodies are JSON, or a file. What any page's form can send without asking is not taken.
 *
 * @throws {InvalidRequest}
 */
export function refuseOtherMedia({ headers }: FastifyRequest): void {
  const type = headers['content-type'];
  if (type === undefined || TAKEN.test(type)) return;
  throw new InvalidRequest([{ pointer: '#', detail: 'Send the body as application/json.' }]);
}
