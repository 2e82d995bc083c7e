import { QuantitySymbol } from './quantity.tsx';

/** One piece of a line of working, as the server sets it. */
export interface Token {
  kind: 'symbol' | 'number' | 'unit' | 'operator' | 'text';
  text: string;
  /** Where one's own and the right working part ways: underlined in both. */
  differs?: boolean | undefined;
}

const thinSpace = '\u2009';

/** A line of working: symbols italic, figures and units upright, the differing term underlined. */
export function Line({ tokens }: { tokens: readonly Token[] }) {
  return (
    <span className="working-line">
      {tokens.map((token, index) => {
        const piece = <Piece token={token} />;
        return token.differs ? <u key={index}>{piece}</u> : <span key={index}>{piece}</span>;
      })}
    </span>
  );
}

function Piece({ token }: { token: Token }) {
  if (token.kind === 'symbol') return <QuantitySymbol text={token.text} />;
  if (token.kind === 'operator') return ` ${token.text.replace('-', '\u2212')} `;
  if (token.kind === 'unit') return `${thinSpace}${token.text}`;
  if (token.kind === 'number') return token.text.replace(/^-/, '\u2212');
  return token.text;
}
