import { type FocusEvent, type ReactNode, useId } from 'react';
import { ChoiceRows } from '../choice-row.tsx';
import { QuantitySymbol } from '../quantity.tsx';
import { ChooseAll } from './choose-all.tsx';
import { InlineMarkdown } from './inline-markdown.tsx';
import './kinds.css';
import { MatchPairs } from './match-pairs.tsx';
import { OrderSteps } from './order-steps.tsx';
import { blankAnswer, type PartView, type RawAnswer } from './views.ts';

interface PartEntryProps {
  part: PartView;
  answer: RawAnswer | undefined;
  /** Asked back because what was typed can be read in more than one way, or in none. */
  unclear?: string | undefined;
  readOnly?: boolean;
  /** Stands under the prompt: a hint. */
  aside?: ReactNode;
  onChange: (answer: RawAnswer) => void;
  /** The entry was left, or a choice made: worth keeping now. */
  onLeave?: () => void;
}

/** One lettered part: what is asked, room for working, the answer line or the choices. */
export function PartEntry({ part, answer = blankAnswer, unclear, ...props }: PartEntryProps) {
  const id = useId();
  return (
    <li className="part" aria-labelledby={`${id}-prompt`}>
      <p className="part-letter">({part.id})</p>
      <div className="part-body">
        <p className="part-prompt" id={`${id}-prompt`}>
          <InlineMarkdown>{part.prompt}</InlineMarkdown>
          {part.rounding && <span className="part-rounding"> Give it {part.rounding}.</span>}
        </p>
        {props.aside}
        <Entry id={id} part={part} answer={answer} unclear={unclear} {...props} />
        {unclear && (
          <p className="field-error" id={`${id}-unclear`} role="alert">
            {unclear}
          </p>
        )}
      </div>
      <p className="part-marks">
        <span className="visually-hidden">Marks: </span>[{part.marks}]
      </p>
    </li>
  );
}

type EntryProps = Omit<PartEntryProps, 'answer'> & { id: string; answer: RawAnswer };

/** Where the answer goes, by the kind of the part. */
function Entry(props: EntryProps) {
  if (props.part.kind === 'quantity') return <QuantityEntry {...props} />;
  if (props.part.kind === 'choice') return <ChoiceEntry {...props} />;
  return <SeveralEntry {...props} />;
}

function ChoiceEntry({ id, part, answer, readOnly = false, onChange, onLeave }: EntryProps) {
  return (
    <ChoiceRows
      name={id}
      legend={`Choices for (${part.id})`}
      hideLegend
      layout={part.layout}
      disabled={readOnly}
      choices={part.options.map((option) => ({
        id: option.id,
        label: <InlineMarkdown>{option.text}</InlineMarkdown>,
      }))}
      chosen={answer.option}
      onChoose={(option) => {
        onChange({ ...answer, option });
        onLeave?.();
      }}
    />
  );
}

/** Several options make one answer: it is left when the focus leaves them all. */
function SeveralEntry({ id, part, answer, readOnly = false, onChange, onLeave }: EntryProps) {
  const leave = ({ currentTarget, relatedTarget }: FocusEvent) => {
    if (!currentTarget.contains(relatedTarget)) onLeave?.();
  };
  const shared = {
    part: part.id,
    options: part.options,
    chosen: answer.options ?? [],
    disabled: readOnly,
    describedBy: `${id}-prompt`,
    onChange: (options: string[]) => onChange({ ...answer, options }),
  };
  return (
    <div onBlur={leave}>
      {part.kind === 'choices' && <ChooseAll {...shared} />}
      {part.kind === 'order' && <OrderSteps {...shared} />}
      {part.kind === 'match' && <MatchPairs {...shared} rows={part.rows} />}
    </div>
  );
}

function QuantityEntry({ id, part, answer, unclear, readOnly, onChange, onLeave }: EntryProps) {
  return (
    <div className="part-entry">
      <div className="part-working">
        <label className="working-label" htmlFor={`${id}-working`}>
          Working <span>optional, kept and shown back, not marked</span>
        </label>
        <textarea
          id={`${id}-working`}
          className="entry squared"
          rows={2}
          maxLength={2000}
          value={answer.working}
          readOnly={readOnly}
          onChange={(event) => onChange({ ...answer, working: event.target.value })}
          onBlur={onLeave}
        />
      </div>
      <div className="answer-line">
        <label>
          {part.symbol && (
            <span className="answer-symbol" aria-hidden="true">
              <QuantitySymbol text={part.symbol} /> =
            </span>
          )}
          <span className="visually-hidden">Answer to ({part.id})</span>
          <input
            className="entry number"
            inputMode="decimal"
            autoComplete="off"
            maxLength={200}
            value={answer.text}
            readOnly={readOnly}
            aria-invalid={unclear ? true : undefined}
            aria-describedby={unclear ? `${id}-unclear` : `${id}-prompt`}
            onChange={(event) => onChange({ ...answer, text: event.target.value })}
            onBlur={onLeave}
          />
        </label>
        {part.units.length > 0 && <UnitChoice {...{ part, answer, readOnly, onChange, onLeave }} />}
      </div>
    </div>
  );
}

type UnitChoiceProps = Pick<EntryProps, 'part' | 'answer' | 'readOnly' | 'onChange' | 'onLeave'>;

function UnitChoice({ part, answer, readOnly, onChange, onLeave }: UnitChoiceProps) {
  return (
    <select
      className="entry unit"
      aria-label={`Unit of (${part.id})`}
      value={answer.unit ?? ''}
      disabled={readOnly}
      onChange={(event) => onChange({ ...answer, unit: event.target.value || null })}
      onBlur={onLeave}
    >
      <option value="">unit</option>
      {part.units.map((unit) => (
        <option key={unit}>{unit}</option>
      ))}
    </select>
  );
}
