import { describe, expect, it } from '@jest/globals';
import { readSnippet } from './snippet.ts';
import { countWords, nearestWord, wordsIn } from './vocabulary.ts';

describe('words of a query', () => {
  it.each<[string, string[]]>([
    ['Voltage drop', ['voltage', 'drop']],
    ['DC-DC 12.8 V', ['dc-dc', '12.8', 'v']],
    ['4 mm²', ['4', 'mm2']],
    ["fuse' & !run | (lamp) <-> x:* \\ \0", ['fuse', 'run', 'lamp', 'x']],
    ['Ω °C — “run”', ['ω', 'c', 'run']],
    ['.-. ... --', []],
    ['\ud800 lone', ['lone']],
  ])('%j', (text, words) => {
    expect(wordsIn(text)).toEqual(words);
  });
});

describe('the word that was meant', () => {
  const vocabulary = countWords([
    'alternator alternator ferrule fuse fuses bulkhead absorption battery batteries tail 12 mm²',
  ]);

  it.each([
    ['fuze', 'fuse', false],
    ['fues', 'fuse', false],
    ['ferule', 'ferrule', false],
    ['alterntaor', 'alternator', false],
    ['absorbtion', 'absorption', false],
    ['altarnat', 'alternator', true],
    ['altarnat', 'altarnat', false],
    ['fuse', 'fuse', true],
    ['absorp', 'absorp', true],
    ['tial', 'tail', false],
    ['fus', 'fus', false],
    ['zzzzzzzz', 'zzzzzzzz', true],
  ])('%s is %s (last: %s)', (typed, meant, isLast) => {
    expect(nearestWord(typed, vocabulary, isLast)).toBe(meant);
  });
});

describe('a snippet', () => {
  it('is plain text with the places of the finds', () => {
    const whole = { opening: 'The fuse', closing: 'the cable.' };
    expect(readSnippet('The \ue000fuse\ue001 protects the \ue000cable\ue001.', whole)).toEqual({
      text: 'The fuse protects the cable.',
      marks: [
        { from: 4, to: 8 },
        { from: 22, to: 27 },
      ],
    });
  });

  it('shows where it is cut out of a longer text, its places moved along', () => {
    const whole = { opening: 'First of all', closing: 'and so on.' };
    expect(readSnippet('the \ue000fuse\ue001 protects', whole)).toEqual({
      text: '… the fuse protects …',
      marks: [{ from: 6, to: 10 }],
    });
  });
});
