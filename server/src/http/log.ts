import { pino } from 'pino';

/** The server's log, one JSON line an event; what could identify or unlock is never written. */
export const log = pino({
  level: process.env['LOG_LEVEL'] ?? (process.env['NODE_ENV'] === 'test' ? 'silent' : 'info'),
  redact: [
    'password',
    'token',
    'cookie',
    'authorization',
    'err.parameters',
    'err.sql',
    'err.parent',
    'err.original',
  ],
  base: undefined,
});
