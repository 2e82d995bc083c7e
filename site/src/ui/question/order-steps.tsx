import { useEffect, useRef, useState } from 'react';
import { InlineMarkdown } from './inline-markdown.tsx';

interface Step {
  id: string;
  text: string;
}

interface OrderStepsProps {
  /** Of the part, such as "a". */
  part: string;
  /** As they were drawn, in no order. */
  options: readonly Step[];
  /** Their ids as they were put; empty before the first move. */
  chosen: readonly string[];
  disabled?: boolean;
  describedBy: string;
  onChange: (order: string[]) => void;
}

type Way = 'up' | 'down';

/** Steps to put in order: each is moved up or down by its own two buttons. */
export function OrderSteps({ part, options, chosen, disabled = false, ...props }: OrderStepsProps) {
  const list = useRef<HTMLOListElement>(null);
  const [moved, setMoved] = useState<{ id: string; way: Way } | null>(null);
  const [said, setSaid] = useState('');
  const laid = layOut(options, chosen);
  const isPut = chosen.length > 0;

  // A row that moves takes the focus out of the page with it, so it is given back.
  useEffect(() => {
    if (!moved) return;
    list.current
      ?.querySelector<HTMLElement>(`[data-step="${CSS.escape(moved.id)}"] .move-${moved.way}`)
      ?.focus();
  }, [moved]);

  const move = (from: number, way: Way) => {
    const to = way === 'up' ? from - 1 : from + 1;
    const step = laid[from];
    if (!step || to < 0 || to >= laid.length) return;
    const ids = laid.map(({ id }) => id);
    ids.splice(from, 1);
    ids.splice(to, 0, step.id);
    setMoved({ id: step.id, way });
    setSaid(`${plain(step.text)}: step ${to + 1} of ${laid.length}.`);
    props.onChange(ids);
  };

  return (
    <div role="group" aria-label={`Steps for (${part})`} aria-describedby={props.describedBy}>
      <p className="entry-legend">
        Move the steps until the first to do is at the top.{' '}
        <span>{isPut ? 'This is your order.' : 'Nothing has been put in order yet.'}</span>
      </p>
      <ol className={isPut ? 'order-steps put' : 'order-steps'} ref={list}>
        {laid.map((step, index) => (
          <li key={step.id} data-step={step.id}>
            <span className="step-number">{index + 1}</span>
            <span className="step-text">
              <InlineMarkdown>{step.text}</InlineMarkdown>
            </span>
            {!disabled && (
              <span className="step-moves not-printed">
                <MoveButton
                  way="up"
                  step={step}
                  isEnd={index === 0}
                  onMove={() => move(index, 'up')}
                />
                <MoveButton
                  way="down"
                  step={step}
                  isEnd={index === laid.length - 1}
                  onMove={() => move(index, 'down')}
                />
              </span>
            )}
          </li>
        ))}
      </ol>
      {!disabled && !isPut && (
        <button
          type="button"
          className="text-button not-printed"
          onClick={() => props.onChange(laid.map(({ id }) => id))}
        >
          They are in the right order as they stand
        </button>
      )}
      <p className="visually-hidden" role="status">
        {said}
      </p>
    </div>
  );
}

/** As they were put; a step that is missing from the order stands at the end. */
function layOut(steps: readonly Step[], order: readonly string[]): Step[] {
  const placeOf = ({ id }: Step) => (order.includes(id) ? order.indexOf(id) : order.length);
  return [...steps].sort((one, other) => placeOf(one) - placeOf(other));
}

const plain = (markdown: string) => markdown.replaceAll(/[*_`]/g, '');

interface MoveButtonProps {
  way: Way;
  step: Step;
  /** At the end of the list it cannot go further, yet it keeps the focus. */
  isEnd: boolean;
  onMove: () => void;
}

function MoveButton({ way, step, isEnd, onMove }: MoveButtonProps) {
  return (
    <button
      type="button"
      className={`move-${way}`}
      aria-label={`Move ${way}: ${plain(step.text)}`}
      aria-disabled={isEnd || undefined}
      onClick={onMove}
    >
      <svg viewBox="0 0 16 16" width="16" height="16" aria-hidden="true">
        <path d={way === 'up' ? 'M8 14V3M3 8 8 3 13 8' : 'M8 2V13M3 8 8 13 13 8'} />
      </svg>
    </button>
  );
}
