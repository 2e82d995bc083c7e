import { type QueryClient } from '@tanstack/react-query';
import { createBrowserRouter, type RouteObject, RouterContextProvider } from 'react-router-dom';
import { queryClientContext } from './api/query-client.ts';
import { Failure } from './routes/failure.tsx';
import { Opening } from './routes/opening.tsx';
import { Root } from './routes/root.tsx';
import { Shell } from './routes/shell.tsx';

/** Every page is lazy. Pages under the shell have the running head; bare pages draw their own. */
const pages: RouteObject[] = [
  { index: true, lazy: () => import('./routes/front.tsx') },
  { path: 'sign-in', lazy: () => import('./routes/sign-in.tsx') },
  { path: 'sign-up', lazy: () => import('./routes/sign-up.tsx') },
  { path: 'sign-up/sent', lazy: () => import('./routes/sign-up-sent.tsx') },
  { path: 'confirm', lazy: () => import('./routes/confirm.tsx') },
  { path: 'second-factor', lazy: () => import('./routes/second-factor.tsx') },
  { path: 'reset', lazy: () => import('./routes/reset.tsx') },
  { path: 'reset/new', lazy: () => import('./routes/reset-new.tsx') },
  { path: 'email-change', lazy: () => import('./routes/email-change.tsx') },
  { path: 'email-change/undo', lazy: () => import('./routes/email-change-undo.tsx') },
  { path: 'first-administrator', lazy: () => import('./routes/first-administrator.tsx') },
  { path: 'account', lazy: () => import('./routes/account.tsx') },
  { path: 'check', lazy: () => import('./routes/check.tsx') },
  { path: 'check/:code', lazy: () => import('./routes/check-link.tsx') },
  { path: 'course', lazy: () => import('./routes/course.tsx') },
  { path: 'sheets/:number', lazy: () => import('./routes/sheet.tsx') },
  { path: 'tables', lazy: () => import('./routes/tables.tsx') },
  { path: 'glossary', lazy: () => import('./routes/glossary.tsx') },
  { path: 'search', lazy: () => import('./routes/search.tsx') },
  { path: 'worksheets/:number', lazy: () => import('./routes/worksheet.tsx') },
  { path: 'worksheet-attempts/:id', lazy: () => import('./routes/worksheet-attempt.tsx') },
  { path: 'practice', lazy: () => import('./routes/practice.tsx') },
  { path: 'practice/:slug', lazy: () => import('./routes/practice-question.tsx') },
  { path: 'papers/:slug', lazy: () => import('./routes/paper.tsx') },
  { path: 'sittings/:id/result', lazy: () => import('./routes/sitting-result.tsx') },
  { path: 'record', lazy: () => import('./routes/record.tsx') },
  { path: 'certificates/:id', lazy: () => import('./routes/certificate.tsx') },
  { path: 'results', lazy: () => import('./routes/results.tsx') },
  { path: 'classes', lazy: () => import('./routes/classes.tsx') },
  { path: 'class/:id', lazy: () => import('./routes/class.tsx') },
  { path: 'people', lazy: () => import('./routes/people.tsx') },
  { path: 'certificates', lazy: () => import('./routes/certificates.tsx') },
  { path: 'problems/:slug', lazy: () => import('./routes/problem.tsx') },
  { path: '*', lazy: () => import('./routes/not-found.tsx') },
];

const barePages: RouteObject[] = [
  {
    path: 'sittings/:id',
    lazy: () => import('./routes/sitting-desk.tsx'),
    children: [
      { index: true, lazy: () => import('./routes/sitting.tsx') },
      { path: 'review', lazy: () => import('./routes/sitting-review.tsx') },
    ],
  },
];

export const routes: RouteObject[] = [
  {
    Component: Root,
    ErrorBoundary: Failure,
    HydrateFallback: Opening,
    children: [
      { Component: Shell, children: [{ ErrorBoundary: Failure, children: pages }] },
      ...barePages,
    ],
  },
];

export function provideCache(queryClient: QueryClient): RouterContextProvider {
  const context = new RouterContextProvider();
  context.set(queryClientContext, queryClient);
  return context;
}

export function createRouter(queryClient: QueryClient) {
  return createBrowserRouter(routes, { getContext: () => provideCache(queryClient) });
}
