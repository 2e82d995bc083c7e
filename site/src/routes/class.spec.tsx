import { screen, within } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { beforeEach, expect, it } from 'vitest';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { makeClass, makeMember } from '../testing/classes.ts';
import { renderRoute } from '../testing/render-route.tsx';

const view = makeClass({
  members: [
    makeMember({
      attempts: [
        { id: 'a1', worksheet: 'W3', attempt: 1, handedInOn: '2026-11-30', marks: 4, outOf: 7 },
      ],
    }),
    makeMember({ id: 'm2', givenName: 'Amadi', familyName: 'Thrale', daysThere: 11 }),
  ],
  slips: [
    {
      question: 'Feeding the chart table',
      part: 'a',
      says: 'You counted the cable out but not back.',
      count: 7,
      of: 10,
    },
  ],
  tooFew: false,
});

beforeEach(() => {
  signInAs(['trainer']);
  serve('get', `/api/classes/${view.id}`, view);
});

it('shows each trainee with the map in words, and the slips with how many made them', async () => {
  renderRoute(`/class/${view.id}`);
  const row = await screen.findByRole('row', { name: /Ifeoma Castellan/ });
  expect(within(row).getByRole('img', { name: '1 of 2 sheets done, W1 passed' })).toBeVisible();
  const slip = screen.getByRole('row', { name: /Feeding the chart table/ });
  expect(slip).toHaveTextContent(/counted the cable out but not back.*7 of 10/);
});

it('narrows the table to those who are stuck', async () => {
  const { user } = renderRoute(`/class/${view.id}`);
  await user.click(await screen.findByRole('radio', { name: 'Stuck 1' }));
  expect(screen.getByRole('rowheader', { name: 'Amadi Thrale' })).toBeVisible();
  expect(screen.queryByRole('rowheader', { name: 'Ifeoma Castellan' })).toBeNull();
});

it('leads from a trainee to their marked worksheets', async () => {
  const { user } = renderRoute(`/class/${view.id}`);
  await user.click(await screen.findByRole('link', { name: 'Amadi Thrale' }));
  const own = await screen.findByRole('region', { name: 'Marked worksheets of Amadi Thrale' });
  expect(own).toHaveTextContent('None handed in yet');
  await user.click(within(own).getByRole('link', { name: 'Of the whole class' }));
  const all = await screen.findByRole('region', { name: 'Marked worksheets' });
  expect(within(all).getByRole('link', { name: 'Ifeoma Castellan W3' })).toHaveAttribute(
    'href',
    '/worksheet-attempts/a1',
  );
});

it('gives no slips while too few have answered', async () => {
  serve('get', `/api/classes/${view.id}`, { ...view, slips: [], tooFew: true });
  renderRoute(`/class/${view.id}`);
  expect(await screen.findByText(/Fewer than five have answered/)).toBeVisible();
});

it('shows the code to hand out when nobody has joined', async () => {
  serve('get', `/api/classes/${view.id}`, { ...view, members: [] });
  renderRoute(`/class/${view.id}`);
  const empty = (await screen.findByText('Nobody has joined yet')).closest('section');
  expect(empty).toHaveTextContent('HQ26-A7KM');
});

it("keeps another trainer's class to itself", async () => {
  serveWith('get', `/api/classes/${view.id}`, () => problemReply(404, 'not-found'));
  renderRoute(`/class/${view.id}`);
  expect(await screen.findByRole('heading', { name: 'There is no such sheet' })).toBeVisible();
});

it('lists classes, and opens only those the trainer trains', async () => {
  const listed = {
    id: view.id,
    name: 'Autumn 2026',
    school: view.school,
    course: view.course.title,
    startsOn: view.startsOn,
    endsOn: view.endsOn,
    joinCode: view.joinCode,
    members: 12,
    trainer: true,
  };
  const other = { ...listed, id: 'c2', name: 'Spring 2027', trainer: false, joinCode: null };
  serve('get', '/api/classes', { classes: [listed, other] });
  renderRoute('/classes');
  expect(await screen.findByRole('link', { name: 'Autumn 2026' })).toHaveAttribute(
    'href',
    `/class/${view.id}`,
  );
  expect(screen.getByRole('rowheader', { name: 'Spring 2027' })).toBeVisible();
  expect(screen.queryByRole('link', { name: 'Spring 2027' })).toBeNull();
});

it('says when there is no class, and offers to try again when the list fails', async () => {
  serveWith('get', '/api/classes', () => problemReply(500, 'internal', { title: 'It broke' }));
  const { user } = renderRoute('/classes');
  expect(await screen.findByRole('alert')).toHaveTextContent('It broke');
  serve('get', '/api/classes', { classes: [] });
  await user.click(screen.getByRole('button', { name: 'Try again' }));
  expect(await screen.findByText('No class yet')).toBeVisible();
});

it('opens a class for an administrator and tells its code', async () => {
  signInAs(['administrator']);
  serve('get', '/api/classes', { classes: [] });
  let sent: unknown;
  serveWith('post', '/api/classes', (body) => {
    sent = body;
    const opened = { id: 'c9', name: 'Spring class', joinCode: 'K7QM-X3RT' };
    return HttpResponse.json({ class: opened }, { status: 201 });
  });
  const { user } = renderRoute('/classes');
  await user.type(await screen.findByLabelText('Name of the class'), 'Spring class');
  await user.type(screen.getByLabelText('First day'), '2027-01-11');
  await user.type(screen.getByLabelText('Last day'), '2027-04-02');
  await user.type(screen.getByLabelText('Emails of its trainers'), 'a@s.example, b@s.example');
  await user.click(screen.getByRole('button', { name: 'Open the class' }));
  expect(await screen.findByText('K7QM-X3RT')).toBeVisible();
  expect(sent).toEqual({
    ...{ name: 'Spring class', startsOn: '2027-01-11', endsOn: '2027-04-02' },
    trainers: ['a@s.example', 'b@s.example'],
  });
});
