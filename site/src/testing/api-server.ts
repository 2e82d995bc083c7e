import { http, HttpResponse, type JsonBodyType } from 'msw';
import { setupServer } from 'msw/node';
import { type SessionView } from '../api/views.ts';

/** Stands in for the server in page tests; a request without a handler fails the test. */
export const apiServer = setupServer(
  http.get('*/api/session', () => problemReply(401, 'not-signed-in')),
);

export function problemReply(status: number, slug: string, more: object = {}) {
  return HttpResponse.json(
    { type: `/problems/${slug}`, title: slug, status, instance: 'urn:uuid:0', ...more },
    { status, headers: { 'content-type': 'application/problem+json' } },
  );
}

/** 202 or 204: done, nothing to say. */
export function acceptedReply(status: 202 | 204 = 202): HttpResponse<JsonBodyType> {
  return status === 202
    ? HttpResponse.json({}, { status })
    : new HttpResponse<JsonBodyType>(null, { status });
}

type Method = 'get' | 'post' | 'put' | 'delete';

/** Answers one route with a body: `serve('get', '/api/front', front)`. */
export function serve(method: Method, path: string, body: JsonBodyType): void {
  serveWith(method, path, () => HttpResponse.json(body));
}

/** Answers one route after looking at what was sent; `problemReply` makes a refusal. */
export function serveWith(
  method: Method,
  path: string,
  reply: (sent: unknown) => HttpResponse<JsonBodyType>,
): void {
  apiServer.use(
    http[method](`*${path}`, async ({ request }) => {
      const text = await request.text();
      return reply(text ? (JSON.parse(text) as unknown) : null);
    }),
  );
}

export function makeSession(
  roles: SessionView['account']['roles'] = ['trainee'],
  more: Partial<SessionView> = {},
): SessionView {
  return {
    account: {
      id: '7d0f6a52-0c5e-4f3e-9a3b-3f1c9b6a0001',
      givenName: 'Ifeoma',
      familyName: 'Castellan',
      email: 'ifeoma.castellan@harrowquay.example',
      roles,
    },
    secondFactor: roles.includes('administrator') ? 'done' : 'none',
    idleEndsAt: '2026-12-01T14:00:00Z',
    endsAt: '2026-12-01T22:00:00Z',
    authenticatedAt: '2026-12-01T12:00:00Z',
    demonstration: true,
    ...more,
  };
}

/** Signs somebody in for this test. */
export function signInAs(roles?: SessionView['account']['roles'], more?: Partial<SessionView>) {
  const session = makeSession(roles, more);
  serve('get', '/api/session', session);
  return session;
}
