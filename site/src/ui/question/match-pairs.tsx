import { useId } from 'react';
import { Terminal } from '../symbols/terminal.tsx';
import { InlineMarkdown } from './inline-markdown.tsx';

interface Side {
  id: string;
  text: string;
}

interface MatchPairsProps {
  /** Of the part, such as "a". */
  part: string;
  rows: readonly Side[];
  options: readonly Side[];
  /** The option for each row, '' where none has been chosen. */
  chosen: readonly string[];
  disabled?: boolean;
  describedBy: string;
  onChange: (chosen: string[]) => void;
}

/** Each item on the left is given one of the texts on the right; a text may serve several. */
export function MatchPairs({ part, rows, options, chosen, disabled, ...props }: MatchPairsProps) {
  const id = useId();
  const choose = (row: number, option: string) =>
    props.onChange(rows.map((_, index) => (index === row ? option : (chosen[index] ?? ''))));
  return (
    <div role="group" aria-label={`Pairs for (${part})`} aria-describedby={props.describedBy}>
      <p className="entry-legend">
        Choose what belongs to each. <span>One text may serve several.</span>
      </p>
      <ul className="match-pairs">
        {rows.map((row, index) => (
          <li key={row.id}>
            <label htmlFor={`${id}-${row.id}`}>
              <InlineMarkdown>{row.text}</InlineMarkdown>
            </label>
            <Terminal state={chosen[index] ? 'done' : 'open'} width={44} />
            <select
              id={`${id}-${row.id}`}
              className="entry"
              value={chosen[index] ?? ''}
              disabled={disabled}
              onChange={(event) => choose(index, event.target.value)}
            >
              <option value="">choose</option>
              {options.map((option) => (
                <option key={option.id} value={option.id}>
                  {option.text}
                </option>
              ))}
            </select>
          </li>
        ))}
      </ul>
    </div>
  );
}
