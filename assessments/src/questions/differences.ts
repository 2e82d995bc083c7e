import { type Line, type Token } from './types.ts';

/** Marks, in both columns, the terms where own and right working part ways. */
export function flagDifferences(yours: Line[], worked: Line[]): [Line[], Line[]] {
  const offset = Math.max(0, worked.length - yours.length);
  const pairs = yours.map((line, index) => flagPair(line, worked[offset + index] ?? []));
  const flagged = worked.map((line, index) => pairs[index - offset]?.[1] ?? line);
  return [pairs.map(([line]) => line), flagged];
}

function flagPair(yours: Line, worked: Line): [Line, Line] {
  const common = longestCommon(yours, worked);
  return [
    // "R =" only names what was asked; it is the figure that differs.
    yours.map((token, index) =>
      flag(token, !common.some(([y]) => y === index) && !(index === 0 && yours[1]?.text === '=')),
    ),
    worked.map((token, index) => flag(token, !common.some(([, w]) => w === index))),
  ];
}

function flag(token: Token, differs: boolean): Token {
  return differs ? { ...token, differs } : token;
}

/** Pairs of places where the two lines agree, by the longest run of them in order. */
function longestCommon(a: Line, b: Line): [number, number][] {
  const lengths = Array.from({ length: a.length + 1 }, () =>
    new Array<number>(b.length + 1).fill(0),
  );
  const at = (i: number, j: number): number => lengths[i]?.[j] ?? 0;
  for (let i = a.length - 1; i >= 0; i -= 1) {
    for (let j = b.length - 1; j >= 0; j -= 1) {
      const row = lengths[i] ?? [];
      row[j] = isSame(a[i], b[j]) ? at(i + 1, j + 1) + 1 : Math.max(at(i + 1, j), at(i, j + 1));
    }
  }
  const pairs: [number, number][] = [];
  for (let i = 0, j = 0; i < a.length && j < b.length;) {
    if (isSame(a[i], b[j])) pairs.push([i++, j++]);
    else if (at(i + 1, j) >= at(i, j + 1)) i += 1;
    else j += 1;
  }
  return pairs;
}

function isSame(a: Token | undefined, b: Token | undefined): boolean {
  return a !== undefined && a.kind === b?.kind && a.text === b.text;
}
