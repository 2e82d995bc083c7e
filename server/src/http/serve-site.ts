import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import fastifyStatic from '@fastify/static';
import { join } from 'node:path';
import { NotFound } from '../problems/common.errors.ts';
import { sendProblem } from '../problems/problem.filter.ts';

/** Serves the built site; every address that is not a file or a route is one of its pages. */
export async function serveSite(app: NestFastifyApplication, folder: string): Promise<void> {
  const fastify = app.getHttpAdapter().getInstance();
  await fastify.register(fastifyStatic, {
    root: join(folder, 'assets'),
    prefix: '/assets/',
    immutable: true,
    maxAge: '365d',
    decorateReply: true,
  });
  fastify.setNotFoundHandler((request, reply) => {
    const isPage =
      request.method === 'GET' && !/^\/(api|assets|livez|readyz)(\/|$)/.test(request.url);
    if (!isPage) return sendProblem(new NotFound(), request, reply);
    return reply.header('cache-control', 'no-cache').sendFile('index.html', folder);
  });
}
