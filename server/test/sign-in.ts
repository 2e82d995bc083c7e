import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { getConnectionToken } from '@nestjs/sequelize';
import { QueryTypes, type Sequelize } from 'sequelize';
import { SessionsService } from '../src/sessions/sessions.service.ts';

type Method = 'GET' | 'POST' | 'PUT' | 'DELETE';

export interface Reply {
  readonly status: number;
  readonly body: any; // eslint-disable-line @typescript-eslint/no-explicit-any -- tests look into any answer
  readonly headers: Record<string, unknown>;
  readonly raw: Buffer;
}

export interface Caller {
  readonly sessionId: string | null;
  call(
    method: Method,
    path: string,
    body?: object,
    headers?: Record<string, string>,
  ): Promise<Reply>;
}

function caller(app: NestFastifyApplication, sessionId: string | null, cookie: string): Caller {
  return {
    sessionId,
    // eslint-disable-next-line max-params -- reads like a request line
    call: async (method, path, body, headers = {}) => {
      const response = await app.inject({
        method,
        url: path,
        headers: { 'sec-fetch-site': 'same-origin', ...(cookie ? { cookie } : {}), ...headers },
        ...(body ? { payload: body } : {}),
      });
      const isJson = String(response.headers['content-type'] ?? '').includes('json');
      return {
        status: response.statusCode,
        body: isJson ? (JSON.parse(response.body) as unknown) : response.body,
        headers: response.headers,
        raw: response.rawPayload,
      };
    },
  };
}

/** Calls without a session. */
export const stranger = (app: NestFastifyApplication): Caller => caller(app, null, '');

/** Opens a session for the account, with the second factor given. */
export async function signIn(app: NestFastifyApplication, accountId: string): Promise<Caller> {
  const sessions = app.get(SessionsService);
  const opened = await sessions.open(accountId, { device: 'test', address: '127.0.0.1' });
  await app
    .get<Sequelize>(getConnectionToken())
    .query('UPDATE sessions SET second_factor_at = started_at WHERE id = $1', {
      bind: [opened.id],
      type: QueryTypes.UPDATE,
    });
  return caller(app, opened.id, `${sessions.cookie().name}=${opened.token}`);
}
