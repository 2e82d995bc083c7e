import '@testing-library/jest-dom/vitest';
import { cleanup, configure } from '@testing-library/react';
import { afterAll, afterEach, beforeAll, vi } from 'vitest';
import { apiServer } from './api-server.ts';

// The first test of a file waits while its page is fetched and compiled.
configure({ asyncUtilTimeout: 5000 });

// jsdom knows neither.
vi.stubGlobal('matchMedia', (media: string) =>
  Object.assign(new EventTarget(), { matches: false, media }),
);
vi.stubGlobal('scrollTo', () => {});

// A loaded machine may take its time over the first page.
configure({ asyncUtilTimeout: 5_000 });

beforeAll(() => apiServer.listen({ onUnhandledRequest: 'error' }));
afterEach(() => {
  cleanup();
  apiServer.resetHandlers();
  localStorage.clear();
});
afterAll(() => apiServer.close());
