import { http, HttpResponse } from 'msw';
import { expect, it, vi } from 'vitest';
import { apiServer, problemReply, serveWith } from '../testing/api-server.ts';
import { answerOf, api, whenSignedOut } from './client.ts';
import { fieldProblems, isProblem, ProblemError, sayProblem } from './problem.ts';
import { readNext } from './session.ts';

const ask = () => answerOf(api.GET('/api/course')).catch((error: unknown) => error);

it('throws a refusal that can be told by its type', async () => {
  serveWith('get', '/api/course', () => problemReply(409, 'wait-not-over', { mayStartAt: 'soon' }));
  const error = await ask();
  expect(isProblem(error, 'wait-not-over')).toBe(true);
  expect(isProblem(error, 'sitting-closed')).toBe(false);
  expect((error as ProblemError).problem['mayStartAt']).toBe('soon');
});

it('tells of a lost session once, in one place', async () => {
  const told = vi.fn();
  whenSignedOut(told);
  serveWith('get', '/api/course', () => problemReply(401, 'not-signed-in'));
  await ask();
  serveWith('get', '/api/course', () => problemReply(401, 'sign-in-refused'));
  await ask();
  expect(told).toHaveBeenCalledOnce();
});

it('does not mistake silence or a broken page for an answer', async () => {
  apiServer.use(http.get('*/api/course', () => HttpResponse.error()));
  expect(sayProblem(await ask()).title).toBe('The server did not answer');
  apiServer.use(http.get('*/api/course', () => new HttpResponse('<h1>502</h1>', { status: 502 })));
  expect(sayProblem(await ask()).title).toBe('Something went wrong on our side');
});

it('hands field errors to their fields', () => {
  const error = new ProblemError({
    type: '/problems/invalid-request',
    title: 'The request is not in order',
    status: 422,
    errors: [{ pointer: '#/email', detail: 'That is not an email address.' }],
  });
  expect(fieldProblems(error)).toEqual({ email: 'That is not an email address.' });
});

it('goes back only to paths of this site', () => {
  expect(readNext('?next=%2Fsheets%2F3.4')).toBe('/sheets/3.4');
  expect(readNext('?next=%2F%2Felsewhere.example')).toBeNull();
  expect(readNext('?next=https%3A%2F%2Felsewhere.example')).toBeNull();
});
