import { screen, within } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { makeCourseMap } from '../testing/course-map.ts';
import { renderRoute } from '../testing/render-route.tsx';

it('says the state of every sheet and worksheet in words', async () => {
  signInAs();
  serve('get', '/api/course', makeCourseMap());
  renderRoute('/course');
  const way = await screen.findByRole('region', { name: '1 Circuits and safe isolation' });
  expect(
    within(way).getByRole('link', { name: /1\.4 Isolate, lock, prove dead, done, revised since/ }),
  ).toHaveAttribute('href', '/sheets/1.4');
  expect(way).toHaveTextContent(/Worksheet W1.*100\s%, passed/);
  const schedule = screen.getByRole('table');
  expect(within(schedule).getByRole('row', { name: /Voltage drop/ })).toHaveTextContent(
    /0 of 1.*Worksheet not passed.*57\s%.*30 Nov 2026/,
  );
  expect(within(schedule).getByRole('row', { name: /Conductors/ })).toHaveTextContent(
    'Not yet issued',
  );
});

it('carries on where the reader was', async () => {
  signInAs();
  serve('get', '/api/course', makeCourseMap());
  renderRoute('/course');
  expect(await screen.findByRole('link', { name: 'Carry on with 3.4' })).toHaveAttribute(
    'href',
    '/sheets/3.4#p4',
  );
});

it('takes somebody without a class into one by its code', async () => {
  signInAs();
  let joined = false;
  serveWith('get', '/api/course', () =>
    HttpResponse.json(joined ? makeCourseMap() : makeCourseMap({ class: null, trainer: null })),
  );
  serveWith('post', '/api/class-memberships', (sent) => {
    if ((sent as { joinCode: string }).joinCode !== 'HQ26-A7KM') {
      return problemReply(404, 'join-code-unknown', { title: 'No class has this code' });
    }
    joined = true;
    return HttpResponse.json({ class: { id: 'c', name: 'Autumn 2026' } }, { status: 201 });
  });
  const { user } = renderRoute('/course');
  const code = await screen.findByLabelText('Code of the class');
  await user.type(code, 'HQ26-XXXX');
  await user.click(screen.getByRole('button', { name: 'Join the class' }));
  expect(await screen.findByRole('alert')).toHaveTextContent('No class has this code');
  await user.clear(code);
  await user.type(code, 'HQ26-A7KM');
  await user.click(screen.getByRole('button', { name: 'Join the class' }));
  await expect.poll(() => screen.queryByLabelText('Code of the class')).toBeNull();
});

it('offers to load the map again when the server fails', async () => {
  signInAs();
  serveWith('get', '/api/course', () => problemReply(500, 'internal', { title: 'It broke' }));
  renderRoute('/course');
  expect(await screen.findByRole('heading', { name: 'It broke' })).toBeVisible();
  expect(screen.getByRole('button', { name: 'Load it again' })).toBeVisible();
});
