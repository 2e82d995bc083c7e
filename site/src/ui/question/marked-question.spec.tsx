import { render, screen, within } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { expect, it } from 'vitest';
import { makeMarked, makeQuestion } from '../../testing/questions.ts';
import { MarkedQuestion } from './marked-question.tsx';
import { type MarkedPartView, type PartView } from './views.ts';

const text = (words: string) => [{ kind: 'text' as const, text: words }];
const pair = (left: string, right: string) => [
  ...text(left),
  { kind: 'operator' as const, text: ':' },
  ...text(right),
];

function open(kind: PartView['kind'], part: Partial<MarkedPartView>) {
  const [asked] = makeQuestion().parts;
  const [marked] = makeMarked().parts;
  if (!asked || !marked) throw new Error('The fixtures have a part each.');
  const parts = [{ ...marked, remarks: [], ...part }];
  render(
    <MemoryRouter>
      <MarkedQuestion marked={makeMarked({ parts })} asked={[{ ...asked, kind }]} />
    </MemoryRouter>,
  );
  const column = screen.getByRole('heading', { name: 'Yours' }).parentElement;
  return within(column ?? document.body)
    .queryAllByText(/^(Right|Wrong):$/)
    .map((sign) => sign.parentElement?.textContent);
}

it('says of each tick whether it is right, wherever it stands', () => {
  const said = open('choices', {
    yours: [text('warm joint'), text('no load')],
    worked: [text('volts along the return'), text('warm joint')],
  });
  expect(said).toEqual(['Right: warm joint', 'Wrong: no load']);
});

it('says of each step whether it stands in its place', () => {
  const said = open('order', {
    yours: [text('1. load on'), text('2. at the load'), text('3. at the posts')],
    worked: [text('1. load on'), text('2. at the posts'), text('3. at the load')],
  });
  expect(said.map((line) => line?.slice(0, 5))).toEqual(['Right', 'Wrong', 'Wrong']);
});

it('says of each pair whether it is right', () => {
  const said = open('match', {
    yours: [pair('bilge pump', '3 %'), pair('cabin light', '3 %')],
    worked: [pair('bilge pump', '3 %'), pair('cabin light', '10 %')],
  });
  expect(said.map((line) => line?.slice(0, 5))).toEqual(['Right', 'Wrong']);
});

it('names the step that went wrong and leads to the paragraph', () => {
  open('quantity', {
    wrongStep: { symbol: 'R', says: 'resistance of the pair' },
    read: {
      sheet: '3.4',
      title: 'The long run',
      heading: 'Out and back',
      paragraph: 7,
      issued: true,
    },
  });
  expect(screen.getByText(/^The step that went wrong/)).toHaveTextContent(
    'The step that went wrong: R, resistance of the pair',
  );
  expect(
    screen.getByRole('link', { name: 'sheet 3.4, paragraph 7, Out and back' }),
  ).toHaveAttribute('href', '/sheets/3.4#p7');
});

it('links to no sheet that is not issued, and blames no step of a blank answer', () => {
  open('quantity', {
    verdict: 'blank',
    yours: [],
    wrongStep: { symbol: 'R', says: '' },
    read: { sheet: '3.1', title: null, heading: null, paragraph: null, issued: false },
  });
  expect(screen.getByText('Read: sheet 3.1, which is not issued yet')).toBeVisible();
  expect(screen.queryByRole('link')).toBeNull();
  expect(screen.queryByText(/went wrong/)).toBeNull();
});
