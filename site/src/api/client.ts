import createClient from 'openapi-fetch';
import { noAnswerProblem, toProblem } from './problem.ts';
import { type paths } from './schema.gen.ts';

let tellSignedOut = () => {};

/** Called when an answer says that nobody is signed in any more. */
export function whenSignedOut(listener: () => void): void {
  tellSignedOut = listener;
}

/** The server's routes, typed by its OpenAPI document. */
export const api = createClient<paths>({
  baseUrl: globalThis.location.origin,
  fetch: (request) => globalThis.fetch(request),
});

interface Reply<Data> {
  data?: Data;
  error?: unknown;
  response: Response;
}

/** Waits for the reply and gives its body; a refusal or silence is thrown as a `ProblemError`. */
export async function answerOf<Data>(call: Promise<Reply<Data>>): Promise<Data> {
  const reply = await call.catch((reason: unknown) => {
    // fetch itself failed: no network, or the request was given up on purpose.
    if (reason instanceof DOMException && reason.name === 'AbortError') throw reason;
    throw noAnswerProblem();
  });
  if (reply.response.ok) return reply.data as Data;
  const refusal = toProblem(reply.error, reply.response.status);
  if (refusal.problem.type === '/problems/not-signed-in') tellSignedOut();
  throw refusal;
}
