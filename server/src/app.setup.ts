import { StandardSchemaSerializerInterceptor, StandardSchemaValidationPipe } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { FastifyAdapter, type NestFastifyApplication } from '@nestjs/platform-fastify';
import compress from '@fastify/compress';
import cookie from '@fastify/cookie';
import helmet from '@fastify/helmet';
import type { FastifyReply, FastifyRequest } from 'fastify';
import multipart from '@fastify/multipart';
import rateLimit from '@fastify/rate-limit';
import type { Config } from './config/config.schema.ts';
import { refuseNullCharacters } from './http/refuse-null-characters.ts';
import { refuseOtherMedia } from './http/refuse-other-media.ts';
import { refuseCrossSite } from './http/same-origin.ts';
import { contentPolicy, earlyHeaders } from './http/security-headers.ts';
import { InvalidRequest, TooManyAttempts } from './problems/common.errors.ts';
import { ProblemFilter, sendProblem } from './problems/problem.filter.ts';

const MAX_BODY_BYTES = 100_000;
const MAX_UPLOAD_BYTES = 5_000_000;

const isHttps = (config: Config) => config.PUBLIC_URL.startsWith('https:');

/** The adapter with its limits; errors raised before Nest sees the request are problems too. */
export function createAdapter(config: Config): FastifyAdapter {
  return new FastifyAdapter({
    bodyLimit: MAX_BODY_BYTES,
    trustProxy: config.TRUST_PROXY === '' ? false : config.TRUST_PROXY.split(','),
    requestTimeout: 30_000,
    routerOptions: { maxParamLength: 300 },
    frameworkErrors: (error: Error, request: FastifyRequest, reply: FastifyReply) => {
      void reply.headers(earlyHeaders(isHttps(config)));
      sendProblem(new InvalidRequest([{ pointer: '#', detail: error.message }]), request, reply);
    },
  });
}

interface SchemaIssue {
  readonly message: string;
  readonly path?: ReadonlyArray<PropertyKey | { key: PropertyKey }> | undefined;
}

function pointerOf(issue: SchemaIssue): string {
  const steps = (issue.path ?? []).map((step) =>
    String(typeof step === 'object' ? step.key : step),
  );
  return ['#', ...steps.map((step) => step.replaceAll('~', '~0').replaceAll('/', '~1'))].join('/');
}

function invalid(issues: readonly SchemaIssue[]): InvalidRequest {
  return new InvalidRequest(
    issues.slice(0, 50).map((issue) => ({ pointer: pointerOf(issue), detail: issue.message })),
  );
}

async function registerPlugins(app: NestFastifyApplication, config: Config): Promise<void> {
  await app.register(cookie);
  await app.register(helmet, {
    contentSecurityPolicy: {
      useDefaults: false,
      directives: contentPolicy,
    },
    strictTransportSecurity: isHttps(config)
      ? { maxAge: 31_536_000, includeSubDomains: true }
      : false,
    referrerPolicy: { policy: 'no-referrer' },
    crossOriginOpenerPolicy: { policy: 'same-origin' },
  });
  await app.register(multipart, {
    limits: { fileSize: MAX_UPLOAD_BYTES, files: 1, fields: 4, fieldSize: 1_000 },
  });
  await app.register(compress, { global: true, threshold: 1_024 });
  await app.register(rateLimit, {
    global: config.NODE_ENV !== 'test',
    max: 1_200,
    timeWindow: '1 minute',
    errorResponseBuilder: (_request, context) =>
      new TooManyAttempts(Math.max(1, Math.ceil(context.ttl / 1_000))),
  });
}

/** All that a running server and a tested one must share. */
export async function setUpApp(app: NestFastifyApplication, config: Config): Promise<void> {
  await registerPlugins(app, config);
  const fastify = app.getHttpAdapter().getInstance();
  fastify.addHook('onRequest', async (request, reply) => {
    refuseCrossSite(request, config.PUBLIC_URL);
    refuseOtherMedia(request);
    if (request.url.startsWith('/api/')) {
      void reply.header('cache-control', 'no-store').header('x-robots-tag', 'noindex, nofollow');
    }
  });
  fastify.addHook('preValidation', async (request) => refuseNullCharacters(request));
  app.useGlobalPipes(new StandardSchemaValidationPipe({ exceptionFactory: invalid }));
  app.useGlobalInterceptors(new StandardSchemaSerializerInterceptor(app.get(Reflector)));
  app.useGlobalFilters(new ProblemFilter());
  app.enableShutdownHooks();
}
