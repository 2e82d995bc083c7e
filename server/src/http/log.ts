import { pino } from 'pino';

/** An error may carry the connection or the statement it failed on: only what helps to find it stays. */
export function sayError(error: unknown): unknown {
  if (!(error instanceof Error)) return error;
  const { code } = error as { code?: unknown };
  return { type: error.name, message: error.message, stack: error.stack, code };
}

/** The server's log, one JSON line an event; what could identify or unlock is never written. */
export const log = pino({
  level: process.env['LOG_LEVEL'] ?? (process.env['NODE_ENV'] === 'test' ? 'silent' : 'info'),
  serializers: { err: sayError },
  redact: ['password', 'token', 'cookie', 'authorization'],
  base: undefined,
});
