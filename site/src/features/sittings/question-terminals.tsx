import { Link } from 'react-router-dom';
import { PennantSign } from '../../ui/symbols/signs.tsx';
import { Terminal } from '../../ui/symbols/terminal.tsx';
import { standingOf, type Standing } from '../../ui/question/views.ts';
import { type DeskState } from './answer-desk.ts';
import { type SittingItem } from './queries.ts';

const standingWords: Record<Standing, string> = {
  answered: 'Answered',
  part: 'Part answered',
  not: 'Not answered',
};

export const terminalOf = { answered: 'done', part: 'begun', not: 'open' } as const;

/** How far each question is, from what stands on this device. */
export function standingsOf(items: readonly SittingItem[], { answers }: DeskState): Standing[] {
  return items.map((item) => standingOf(item.question.parts, answers[item.key] ?? {}));
}

interface QuestionTerminalsProps {
  sittingId: string;
  items: readonly SittingItem[];
  standings: Standing[];
  pennants: Record<string, boolean>;
  current: number;
}

/** The questions of the paper as terminals; answered ones have their ferrule seated. */
export function QuestionTerminals({
  sittingId,
  items,
  standings,
  ...props
}: QuestionTerminalsProps) {
  return (
    <nav className="question-terminals" aria-label="Questions of this paper">
      <ol>
        {items.map((item, index) => {
          const standing = standings[index] ?? 'not';
          const isMarked = props.pennants[item.key] ?? false;
          const said = `Question ${item.number}, ${standingWords[standing].toLowerCase()}${isMarked ? ', come back to' : ''}`;
          return (
            <li key={item.key}>
              <Link
                to={`/sittings/${sittingId}?q=${item.number}`}
                aria-current={item.number === props.current ? 'true' : undefined}
                aria-label={said}
              >
                <b>{item.number}</b>
                {isMarked && <PennantSign />}
                <Terminal state={terminalOf[standing]} width={52} />
              </Link>
            </li>
          );
        })}
      </ol>
      <ul className="terminals-key" aria-hidden="true">
        <li>
          <Terminal state="done" width={44} /> Answered
        </li>
        <li>
          <Terminal state="begun" width={44} /> Part answered
        </li>
        <li>
          <Terminal state="open" width={44} /> Not answered
        </li>
        <li>
          <PennantSign /> Come back to
        </li>
      </ul>
    </nav>
  );
}
