import { screen } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { type PersonView } from '../api/views.ts';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

const person: PersonView = {
  id: 'p1',
  givenName: 'Corin',
  familyName: 'Fairweather',
  email: 'corin.fairweather@harrowquay.example',
  roles: ['trainer'],
  emailConfirmed: true,
  suspended: null,
  joinedAt: '2024-03-04T10:00:00Z',
  lastSeenAt: '2026-11-30T22:47:00Z',
  secondFactor: false,
  sessions: 2,
};

function openDesk(view: PersonView = person) {
  signInAs(['administrator']);
  serve('get', '/api/people', { people: [view], nextCursor: null });
  serve('get', '/api/people/:id', { person: view, lately: [] });
  serve('get', '/api/school/practice-profile', { profile: 'metric' });
  return renderRoute('/people');
}

it('opens a person beside the list and gives a role', async () => {
  const { user } = openDesk();
  await user.click(await screen.findByRole('link', { name: 'Corin Fairweather' }));
  const tick = await screen.findByRole('checkbox', { name: /Certification manager/ });
  expect(tick).not.toBeChecked();
  const changed: PersonView = { ...person, roles: ['trainer', 'certification-manager'] };
  serve('put', '/api/people/:id/roles/:role', changed);
  serve('get', '/api/people/:id', { person: changed, lately: [] });
  await user.click(tick);
  await expect
    .poll(() => screen.getByRole('checkbox', { name: /Certification manager/ }))
    .toBeChecked();
});

it('says why the last administrator stays', async () => {
  const { user } = openDesk({ ...person, roles: ['administrator'] });
  await user.click(await screen.findByRole('link', { name: 'Corin Fairweather' }));
  serveWith('delete', '/api/people/:id/roles/:role', () =>
    problemReply(409, 'last-administrator', { title: 'The last administrator stays' }),
  );
  await user.click(await screen.findByRole('checkbox', { name: /Administrator/ }));
  expect(await screen.findByRole('alert')).toHaveTextContent('The last administrator stays');
  expect(screen.getByRole('checkbox', { name: /Administrator/ })).toBeChecked();
});

it('suspends only with a reason', async () => {
  const { user } = openDesk();
  await user.click(await screen.findByRole('link', { name: 'Corin Fairweather' }));
  await user.click(await screen.findByRole('button', { name: 'Suspend Corin Fairweather' }));
  const reason = screen.getByLabelText('Reason, kept in the log');
  expect(reason).toHaveFocus();

  const suspended = { ...person, suspended: { at: '2026-12-01T13:00:00Z', reason: 'Left' } };
  let sent: unknown;
  serveWith('put', '/api/people/:id/suspension', (body) => {
    sent = body;
    return HttpResponse.json(suspended);
  });
  serve('get', '/api/people/:id', { person: suspended, lately: [] });
  await user.type(reason, 'Left the school');
  await user.click(screen.getByRole('button', { name: 'Suspend Corin Fairweather' }));
  expect(await screen.findByRole('button', { name: 'Reinstate Corin Fairweather' })).toBeVisible();
  expect(sent).toEqual({ reason: 'Left the school' });
});

it('is not opened for a trainer', async () => {
  signInAs(['trainer']);
  renderRoute('/people');
  expect(await screen.findByRole('heading', { name: 'This is not yours to open' })).toBeVisible();
});

it('shows by which practice the school works, and chooses another', async () => {
  const { user } = openDesk();
  expect(await screen.findByRole('radio', { name: /^Metric practice/ })).toBeChecked();
  const button = screen.getByRole('button', { name: 'Choose this profile' });
  expect(button).toBeDisabled();
  await user.click(screen.getByRole('radio', { name: /^AWG practice/ }));
  const sent: unknown[] = [];
  serveWith('put', '/api/school/practice-profile', (body) => {
    sent.push(body);
    return HttpResponse.json({ profile: 'awg' });
  });
  await user.click(button);
  expect(await screen.findByText('The school works by AWG practice.')).toBeVisible();
  expect(sent).toEqual([{ profile: 'awg' }]);
});

it('says that there is no profile before the school is entered', async () => {
  openDesk();
  serveWith('get', '/api/school/practice-profile', () => problemReply(404, 'not-found'));
  expect(await screen.findByText(/The school itself is not entered yet/)).toBeVisible();
});
