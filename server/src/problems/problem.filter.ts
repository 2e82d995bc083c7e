import { Catch, HttpException, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { randomUUID } from 'node:crypto';
import { log } from '../http/log.ts';
import { catalogue } from './catalogue.ts';
import { InvalidRequest, NotFound, TooManyAttempts } from './common.errors.ts';
import { DomainError } from './domain-error.ts';
import type { Problem } from './problem.schema.ts';

const byStatus: Record<number, string> = {
  400: 'invalid-request',
  401: 'not-signed-in',
  403: 'not-allowed',
  404: 'not-found',
  413: 'payload-too-large',
  415: 'invalid-request',
  422: 'invalid-request',
  429: 'too-many-attempts',
  503: 'unavailable',
};

function problemOf(code: string, instance: string, detail?: string): Problem {
  const entry = catalogue[code];
  if (!entry) return internalProblem(instance);
  return { type: `/problems/${code}`, ...entry, ...(detail ? { detail } : {}), instance };
}

function internalProblem(instance: string): Problem {
  return {
    type: '/problems/internal',
    title: 'Something failed on our side',
    status: 500,
    instance,
  };
}

/** Names that Sequelize and pg use when the database cannot be reached. */
const isDatabaseAway = (error: unknown) =>
  error instanceof Error &&
  /^Sequelize(Connection|HostNotFound|AccessDenied|ConnectionAcquire)/.test(error.name);

function statusOf(error: unknown): number {
  if (error instanceof HttpException) return error.getStatus();
  const status: unknown = (error as { statusCode?: unknown } | null)?.statusCode;
  return typeof status === 'number' && Number.isInteger(status) && status >= 400 && status < 600
    ? status
    : 500;
}

/** What Nest or Fastify refused before any of our own code saw it. */
function frameworkProblem(error: unknown, instance: string): Problem {
  const status = statusOf(error);
  const code = byStatus[status];
  const detail = error instanceof Error ? error.message : 'Not understood.';
  if (code === undefined && status >= 500) return internalProblem(instance);
  if (code === 'not-found') return toProblem(new NotFound(), instance);
  if (code === 'too-many-attempts') return toProblem(new TooManyAttempts(60), instance);
  if (code !== undefined && code !== 'invalid-request') return problemOf(code, instance, detail);
  return toProblem(new InvalidRequest([{ pointer: '#', detail }]), instance);
}

/** Turns anything thrown into the problem document a person or program can act on. */
function toProblem(error: unknown, instance: string): Problem {
  if (error instanceof DomainError) {
    return { ...problemOf(error.code, instance, error.message), ...error.extensions };
  }
  if (isDatabaseAway(error)) {
    return problemOf(
      'unavailable',
      instance,
      'The records cannot be reached. Try again in a moment.',
    );
  }
  return frameworkProblem(error, instance);
}

export function sendProblem(error: unknown, request: FastifyRequest, reply: FastifyReply): void {
  const instance = `urn:uuid:${randomUUID()}`;
  const problem = toProblem(error, instance);
  if (problem.status >= 500 && problem.status !== 503) {
    log.error(
      { instance, method: request.method, route: request.routeOptions?.url, err: error },
      'failed',
    );
  }
  if (reply.sent) return;
  if (error instanceof TooManyAttempts) {
    void reply.header('retry-after', String(error.extensions.retryAfterSeconds));
  }
  if (problem.status === 503) void reply.header('retry-after', '5');
  void reply
    .status(problem.status)
    .header('cache-control', 'no-store')
    .header('content-type', 'application/problem+json; charset=utf-8')
    .send(JSON.stringify(problem));
}

@Catch()
export class ProblemFilter implements ExceptionFilter {
  catch(error: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    sendProblem(error, http.getRequest<FastifyRequest>(), http.getResponse<FastifyReply>());
  }
}
