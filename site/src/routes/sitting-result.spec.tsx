import { screen, within } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';
import { certificateId, makeResult, makeSitting, sittingId } from '../testing/sitting.ts';

const page = `/sittings/${sittingId}/result`;

it('says what is missing, where it was lost, what to practise and when to sit again', async () => {
  signInAs();
  serve('get', '/api/sittings/:id/result', makeResult());
  renderRoute(page);
  await screen.findByRole('heading', { level: 1, name: 'Not passed' });
  expect(screen.getByText('23 of 36, three marks short')).toBeVisible();
  expect(screen.getByRole('img', { name: '23 of 36; the pass mark is 26' })).toBeVisible();
  const marks = screen.getByRole('table', { name: 'Marks by subject' });
  expect(within(marks).getByRole('img', { name: '0 of 12 marks' })).toBeVisible();
  expect(screen.getByText('12 of the 13 marks lost are on battery charging.')).toBeVisible();
  // Most lost first; a subject without loss is not named.
  const practice = screen.getAllByRole('link', { name: /^Sheet \d/ });
  expect(practice.map((link) => link.getAttribute('href'))).toEqual(['/sheets/5.6', '/sheets/3.4']);
  expect(screen.getByRole('link', { name: 'Practise W5' })).toHaveAttribute(
    'href',
    '/worksheets/W5',
  );
  expect(screen.getAllByText('15 December 2026')).toHaveLength(2);
  expect(screen.getByText('Appeal within ten working days.')).toBeVisible();
});

it('waits while the paper is marked and then while the certificate is drawn', async () => {
  signInAs();
  let asked = 0;
  const certificate = { id: certificateId, number: 'HQ7K-2M4T-9XWD' };
  serve('get', '/api/sittings/:id', makeSitting({ state: 'handed-in', items: [] }));
  serveWith('get', '/api/sittings/:id/result', () => {
    asked += 1;
    if (asked === 1) return problemReply(409, 'result-not-ready');
    return HttpResponse.json(
      makeResult({
        ...{ passed: true, marks: 36, percent: 100, maySitAgainAt: null },
        certificate: { ...certificate, ready: asked > 2 },
      }),
    );
  });
  renderRoute(page);
  await screen.findByRole('heading', { level: 1, name: 'Handed in, and being marked' });
  await screen.findByRole('heading', { level: 1, name: 'Passed' });
  expect(screen.getByText(/Being drawn and signed/)).toBeVisible();
  expect(screen.queryByRole('link', { name: 'Download the PDF' })).toBeNull();
  expect(await screen.findByRole('link', { name: 'Download the PDF' })).toHaveAttribute(
    'href',
    `/api/certificates/${certificateId}/file`,
  );
}, 20_000);

it('goes back to a paper that is still open', async () => {
  signInAs();
  serveWith('get', '/api/sittings/:id/result', () => problemReply(409, 'result-not-ready'));
  serve('get', '/api/sittings/:id', makeSitting());
  renderRoute(page);
  await screen.findByRole('heading', { level: 1, name: 'Run 1' });
});
