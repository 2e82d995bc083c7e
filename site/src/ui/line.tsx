import { Fragment } from 'react';
import { QuantitySymbol } from './quantity.tsx';

/** One piece of a line of working, as the server sets it. */
export interface Token {
  kind: 'symbol' | 'number' | 'unit' | 'operator' | 'text';
  text: string;
  /** Where one's own and the right working part ways: underlined in both. */
  differs?: boolean | undefined;
}

const thinSpace = '\u2009';
const trueMinus = '\u2212';

/** A line of working: symbols italic, figures and units upright, the differing term underlined. */
export function Line({ tokens }: { tokens: readonly Token[] }) {
  return (
    <span className="working-line">
      {termsOf(tokens).map((term, index) => (
        <Fragment key={index}>
          {term.gap}
          <span className={term.className}>
            {term.tokens.map((token, place) =>
              token.differs ? (
                <u key={place}>
                  <Piece token={token} />
                </u>
              ) : (
                <Piece key={place} token={token} />
              ),
            )}
          </span>
        </Fragment>
      ))}
    </span>
  );
}

interface Term {
  gap: '' | ' ';
  className: 'equals' | 'said' | 'term';
  tokens: Token[];
}

/** A value stays on one line with its unit, a bracket with what it holds, "2L" together. */
function termsOf(tokens: readonly Token[]): Term[] {
  const terms: Term[] = [];
  tokens.forEach((token, index) => {
    const last = terms.at(-1);
    if (last && clings(tokens[index - 1], token)) last.tokens.push(token);
    else {
      const isEquals = index === 0 && token.text === '=';
      const className = isEquals ? 'equals' : token.kind === 'text' ? 'said' : 'term';
      terms.push({ gap: last ? ' ' : '', className, tokens: [token] });
    }
  });
  return terms;
}

function clings(before: Token | undefined, token: Token): boolean {
  if (token.kind === 'unit' || before?.text === '(') return true;
  if (token.text === ')' || token.text === ',') return true;
  return before?.kind === 'number' && token.kind === 'symbol';
}

function Piece({ token }: { token: Token }) {
  if (token.kind === 'symbol') return <QuantitySymbol text={token.text} />;
  if (token.kind === 'operator') return token.text.replace('-', trueMinus);
  if (token.kind === 'unit') return `${thinSpace}${token.text}`;
  if (token.kind === 'number') return token.text.replace(/^-/, trueMinus);
  return token.text;
}
