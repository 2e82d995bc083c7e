import { screen } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { describe, expect, it } from 'vitest';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';
import { certificateId, makePaper, makeSitting, sittingId } from '../testing/sitting.ts';

function open(standing: Parameters<typeof makePaper>[0] = {}) {
  signInAs();
  serve('get', '/api/papers/:slug', makePaper(standing));
  return renderRoute('/papers/final-paper');
}

describe('starting', () => {
  it('starts with the agreement that was read and the name as it will be printed', async () => {
    const { user, router } = open();
    const sent: unknown[] = [];
    serveWith('post', '/api/sittings', (body) => {
      sent.push(body);
      return HttpResponse.json(makeSitting(), { status: 201 });
    });
    serve('get', '/api/sittings/:id', makeSitting());
    const start = await screen.findByRole('button', { name: 'Start the paper: 60 minutes' });
    expect(start).toBeDisabled();
    const family = screen.getByRole('textbox', { name: 'Family name' });
    await user.clear(family);
    await user.type(family, 'Castellán');
    expect(screen.getByText('Ifeoma Castellán')).toBeVisible();
    await user.click(screen.getByRole('checkbox', { name: 'I have read this and agree to it.' }));
    await user.click(start);
    await screen.findByRole('heading', { level: 1, name: 'Run 1' });
    expect(router.state.location.pathname).toBe(`/sittings/${sittingId}`);
    expect(sent).toEqual([
      {
        paper: 'final-paper',
        agreed: true,
        agreementHash: 'a1b2',
        givenName: 'Ifeoma',
        familyName: 'Castellán',
      },
    ]);
  });

  it('says why the paper cannot be started, and keeps what was typed', async () => {
    const { user } = open();
    serveWith('post', '/api/sittings', () =>
      problemReply(409, 'agreement-changed', {
        title: 'The agreement has changed',
        detail: 'Read the new text.',
      }),
    );
    await user.type(await screen.findByRole('textbox', { name: 'Given name' }), ' Ada');
    await user.click(screen.getByRole('checkbox', { name: 'I have read this and agree to it.' }));
    await user.click(screen.getByRole('button', { name: /Start the paper/ }));
    expect(await screen.findByText('The agreement has changed')).toBeVisible();
    expect(screen.getByRole('textbox', { name: 'Given name' })).toHaveValue('Ifeoma Ada');
  });

  it('says the time with what was approved on top, in whole minutes', async () => {
    signInAs();
    serve('get', '/api/papers/:slug', { ...makePaper(), minutes: 67.5, extraTimePercent: 12.5 });
    renderRoute('/papers/final-paper');
    expect(
      await screen.findByText('Your 68 minutes include the extra time approved for you.'),
    ).toBeVisible();
  });
});

describe('where one stands', () => {
  it('goes on with an open sitting', async () => {
    open({ state: 'sitting', sittingId });
    expect(await screen.findByRole('link', { name: 'Go on with the paper' })).toHaveAttribute(
      'href',
      `/sittings/${sittingId}?q=1`,
    );
    expect(screen.queryByRole('button', { name: /Start/ })).toBeNull();
  });

  it('says from when it may be sat again and leads to what to practise', async () => {
    open({
      state: 'waiting',
      mayStartAt: '2026-12-15T10:00:00Z',
      reasons: ['Fourteen days lie between two sittings.'],
      sittings: [
        {
          id: sittingId,
          startedAt: '2026-12-01T10:00:00Z',
          handedInAt: '2026-12-01T10:40:00Z',
          passed: false,
        },
      ],
    });
    expect(
      await screen.findByRole('heading', { name: 'You may sit again from 15 December 2026' }),
    ).toBeVisible();
    expect(screen.getByText(/^14 days lie between two sittings/)).toBeVisible();
    expect(screen.getByRole('link', { name: 'Sat on 1 Dec 2026' })).toHaveAttribute(
      'href',
      `/sittings/${sittingId}/result`,
    );
  });

  it('says that the last sitting is being marked', async () => {
    open({ state: 'waiting', reasons: ['Your paper is being marked.'] });
    expect(
      await screen.findByRole('heading', { name: 'Your paper is being marked.' }),
    ).toBeVisible();
  });

  it('leads to the certificate once it is passed', async () => {
    open({ state: 'passed', certificateId });
    expect(await screen.findByRole('link', { name: 'Open the certificate' })).toHaveAttribute(
      'href',
      `/certificates/${certificateId}`,
    );
  });
});
