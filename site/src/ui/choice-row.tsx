import { type ReactNode } from 'react';

interface Choice {
  id: string;
  label: ReactNode;
  /** Why it cannot be chosen now; it is shown all the same. */
  notOpen?: string;
}

interface ChoiceRowsProps {
  name: string;
  legend: ReactNode;
  hideLegend?: boolean;
  choices: Choice[];
  chosen: string | null;
  /** `sizes`: one ruled row of stock sizes. */
  layout?: 'rows' | 'sizes';
  disabled?: boolean;
  onChoose: (id: string) => void;
}

export function ChoiceRows({ layout = 'rows', ...props }: ChoiceRowsProps) {
  return (
    <fieldset disabled={props.disabled}>
      <legend className={props.hideLegend ? 'visually-hidden' : undefined}>{props.legend}</legend>
      <div className={layout === 'sizes' ? 'size-row' : 'choice-rows'}>
        {props.choices.map((choice) => (
          <label key={choice.id} className={layout === 'rows' ? 'choice' : undefined}>
            <input
              type="radio"
              name={props.name}
              value={choice.id}
              checked={props.chosen === choice.id}
              disabled={choice.notOpen !== undefined}
              onChange={() => props.onChoose(choice.id)}
            />
            {layout === 'rows' && <i />}
            <span>
              {choice.label}
              {choice.notOpen && <small>Not open: {choice.notOpen}</small>}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}

interface SegmentsProps {
  name: string;
  label: string;
  segments: { id: string; label: string; count?: number }[];
  chosen: string;
  onChoose: (id: string) => void;
}

/** A filter or a switch of view: one ruled box, the chosen cell reversed. */
export function Segments({ name, label, segments, chosen, onChoose }: SegmentsProps) {
  return (
    <div className="segments" role="radiogroup" aria-label={label}>
      {segments.map((segment) => (
        <label key={segment.id}>
          <input
            type="radio"
            name={name}
            checked={segment.id === chosen}
            onChange={() => onChoose(segment.id)}
          />
          <span>
            {segment.label} {segment.count !== undefined && <i>{segment.count}</i>}
          </span>
        </label>
      ))}
    </div>
  );
}

interface TickBoxProps {
  label: ReactNode;
  hint?: ReactNode;
  name?: string;
  value?: string;
  checked?: boolean;
  defaultChecked?: boolean;
  disabled?: boolean;
  required?: boolean;
  onChange?: (checked: boolean) => void;
}

export function TickBox({ label, hint, onChange, ...input }: TickBoxProps) {
  return (
    <label className="tick">
      <input
        type="checkbox"
        {...input}
        onChange={onChange && ((event) => onChange(event.target.checked))}
      />
      <i />
      <span>
        {label}
        {hint && <small>{hint}</small>}
      </span>
    </label>
  );
}
