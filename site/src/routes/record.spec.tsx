import { screen, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { type SubjectRecords } from '../features/record/queries.ts';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { makeCertificate } from '../testing/certificate.ts';
import { makeCourseMap } from '../testing/course-map.ts';
import { renderRoute } from '../testing/render-route.tsx';
import { makePaper, sittingId } from '../testing/sitting.ts';

const sat = (passed: boolean | null, handedInAt: string | null = '2026-12-01T10:40:00Z') => ({
  ...{ id: sittingId, startedAt: '2026-12-01T10:00:00Z' },
  ...{ passed, handedInAt },
});

const subjects = {
  subjects: [
    { code: 'CL', name: 'Circuit laws and power', questions: 3, shown: 0, days: 0, lastDay: null },
    { code: 'VD', name: 'Voltage drop', questions: 4, shown: 2, days: 3, lastDay: '2026-11-30' },
  ],
  next: [
    {
      slug: 'vd-deck-lamps',
      title: 'Lamps on deck',
      subject: { code: 'VD', name: 'Voltage drop' },
      level: 'apply',
      lesson: '3.4',
      marks: 4,
      reason: 'went-wrong',
      says: 'It went wrong last time.',
      lastDay: '2026-11-28',
    },
  ],
} satisfies SubjectRecords;

function open(more: { certificates?: unknown[]; paper?: ReturnType<typeof makePaper> } = {}) {
  signInAs();
  serve('get', '/api/course', makeCourseMap());
  serve('get', '/api/papers/:slug', more.paper ?? makePaper());
  serve('get', '/api/record/subjects', subjects);
  serve('get', '/api/me/certificates', { certificates: (more.certificates ?? []) as [] });
  return renderRoute('/record');
}

it('shows certificates with their state, sittings with their result, worksheets with the best mark', async () => {
  open({
    certificates: [
      makeCertificate(),
      makeCertificate({ id: 'c2', state: 'withdrawn', ready: false }),
    ],
    paper: makePaper({ state: 'passed', sittings: [sat(true)] }),
  });
  expect(await screen.findByText(/Valid/)).toBeVisible();
  expect(screen.getByText(/Withdrawn/)).toBeVisible();
  expect(screen.getAllByRole('link', { name: /^Download/ })).toHaveLength(1);
  const sittings = await screen.findByRole('table', { name: 'Sittings' });
  expect(within(sittings).getByRole('link')).toHaveAttribute(
    'href',
    `/sittings/${sittingId}/result`,
  );
  const worksheets = screen.getByRole('table', { name: 'Worksheets' });
  expect(within(worksheets).getByText('6 of 6, 100 %, 9 Oct 2026')).toBeVisible();
});

it('leads back into an open sitting', async () => {
  open({ paper: makePaper({ state: 'sitting', sittingId, sittings: [sat(null, null)] }) });
  const sittings = await screen.findByRole('table', { name: 'Sittings' });
  expect(within(sittings).getByRole('link')).toHaveAttribute('href', `/sittings/${sittingId}?q=1`);
});

it('says what is still empty, and fails in the panel that failed', async () => {
  const { user } = open();
  serveWith('get', '/api/me/certificates', () => problemReply(503, 'unavailable'));
  expect(await screen.findByText(/Not sat yet/)).toBeVisible();
  serve('get', '/api/me/certificates', { certificates: [] });
  await user.click(await screen.findByRole('button', { name: 'Try again' }));
  expect(await screen.findByText(/None yet. A certificate is issued/)).toBeVisible();
});

it('says what has been shown on how many days, and leads to what to practise next', async () => {
  open();
  const table = await screen.findByRole('table', { name: 'What has been shown, by subject' });
  const row = within(table).getByRole('row', { name: /^Voltage drop/ });
  expect(row).toHaveTextContent('2 of 43 days30 Nov 2026');
  expect(within(row).getByRole('img', { name: '2 of 4 questions shown' })).toBeVisible();
  expect(within(row).getByRole('link')).toHaveAttribute('href', '/practice?subject=VD');
  expect(within(table).getByRole('row', { name: /^Circuit laws/ })).toHaveTextContent('not yet');
  expect(screen.getByRole('link', { name: 'Lamps on deck' })).toHaveAttribute(
    'href',
    '/practice/vd-deck-lamps',
  );
  expect(screen.getByText(/It went wrong last time. Last tried 28 Nov 2026/)).toBeVisible();
});
