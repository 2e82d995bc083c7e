import { TickBox } from '../choice-row.tsx';
import { InlineMarkdown } from './inline-markdown.tsx';

interface ChooseAllProps {
  /** Of the part, such as "a". */
  part: string;
  options: readonly { id: string; text: string }[];
  chosen: readonly string[];
  disabled?: boolean;
  describedBy: string;
  onChange: (chosen: string[]) => void;
}

/** Tick all that apply, in one ruled box. */
export function ChooseAll({ part, options, chosen, disabled, ...props }: ChooseAllProps) {
  const tick = (id: string, isChosen: boolean) =>
    // Kept in the order of the list, so that the same choice is always the same answer.
    props.onChange(
      options
        .map((option) => option.id)
        .filter((one) => (one === id ? isChosen : chosen.includes(one))),
    );
  return (
    <fieldset disabled={disabled} aria-describedby={props.describedBy}>
      <legend className="entry-legend">
        <span className="visually-hidden">Choices for ({part}): </span>
        Tick all that apply. <span>Each wrong tick takes back a right one.</span>
      </legend>
      <div className="choice-rows">
        {options.map(({ id, text }) => (
          <TickBox
            key={id}
            label={<InlineMarkdown>{text}</InlineMarkdown>}
            value={id}
            checked={chosen.includes(id)}
            onChange={(isChosen) => tick(id, isChosen)}
          />
        ))}
      </div>
    </fieldset>
  );
}
