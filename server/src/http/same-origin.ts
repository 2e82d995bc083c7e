import type { FastifyRequest } from 'fastify';
import { log } from './log.ts';
import { CrossSiteRequest } from '../problems/common.errors.ts';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Unsafe methods only from our own pages: by Sec-Fetch-Site where the browser sends it,
 * otherwise by Origin. A request with neither comes from no browser page and carries no
 * cookie that a page could have misused, but is refused all the same.
 *
 * @throws {CrossSiteRequest}
 */
export function refuseCrossSite(request: FastifyRequest, publicUrl: string): void {
  if (SAFE.has(request.method)) return;
  const site = request.headers['sec-fetch-site'];
  if (site === 'same-origin') return;
  const { origin } = request.headers;
  if (site === undefined && origin === new URL(publicUrl).origin) return;
  log.warn({ method: request.method, address: request.ip, site }, 'refused another site');
  throw new CrossSiteRequest();
}
