import { Line, type Token } from '../line.tsx';
import { StruckSign, TickSign } from '../symbols/signs.tsx';
import { type MarkedPartView, type PartView } from './views.ts';

type ListedKind = 'choices' | 'order' | 'match';

export const isListed = (kind: PartView['kind']): kind is ListedKind =>
  kind === 'choices' || kind === 'order' || kind === 'match';

interface ListedColumnProps {
  heading: string;
  part: MarkedPartView;
  kind: ListedKind;
}

/** What was ticked, put in order or matched: each line with its own sign. */
export function ListedColumn({ heading, part, kind }: ListedColumnProps) {
  const worked = part.worked.map(sayLine);
  const isRight = (tokens: readonly Token[], index: number) =>
    kind === 'choices' ? worked.includes(sayLine(tokens)) : worked[index] === sayLine(tokens);
  return (
    <div className="yours listed">
      <h4 className="visually-hidden">{heading}</h4>
      {part.yours.length === 0 && <p className="muted">nothing chosen</p>}
      {part.yours.map((tokens, index) => (
        <p key={index} className={isRight(tokens, index) ? 'line-right' : 'line-wrong'}>
          {isRight(tokens, index) ? <TickSign /> : <StruckSign />}
          <span>
            <span className="visually-hidden">
              {isRight(tokens, index) ? 'Right: ' : 'Wrong: '}
            </span>
            <Line tokens={tokens} />
          </span>
        </p>
      ))}
    </div>
  );
}

const sayLine = (tokens: readonly Token[]) => tokens.map(({ text }) => text).join(' ');
