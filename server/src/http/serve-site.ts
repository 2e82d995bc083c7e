import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import fastifyStatic from '@fastify/static';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { NotFound } from '../problems/common.errors.ts';
import { sendProblem } from '../problems/problem.filter.ts';

const SERVER_PATHS = /^\/(api|assets|livez|readyz)(\/|$)/;

async function filesBeside(folder: string): Promise<Set<string>> {
  const entries = await readdir(folder, { withFileTypes: true });
  const files = entries.filter((entry) => entry.isFile() && !entry.name.startsWith('.'));
  return new Set(files.map(({ name }) => name));
}

/** Serves the built site; every address that is not a file or a route is one of its pages. */
export async function serveSite(app: NestFastifyApplication, folder: string): Promise<void> {
  const fastify = app.getHttpAdapter().getInstance();
  await fastify.register(fastifyStatic, {
    root: join(folder, 'assets'),
    prefix: '/assets/',
    immutable: true,
    maxAge: '365d',
  });
  const files = await filesBeside(folder);
  // A route and not a not-found handler: Nest has that one, and there is only one.
  fastify.get('/*', (request: FastifyRequest, reply: FastifyReply) => {
    const [path = '/'] = request.url.split('?', 1);
    if (SERVER_PATHS.test(path)) return sendProblem(new NotFound(), request, reply);
    const name = path.slice(1);
    void reply.header('cache-control', 'no-cache');
    // The code on a certificate leads to its holder's name: no search engine keeps that page.
    if (path.startsWith('/check/')) void reply.header('x-robots-tag', 'noindex, nofollow');
    return reply.sendFile(files.has(name) ? name : 'index.html', folder, { cacheControl: false });
  });
}
