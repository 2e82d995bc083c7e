import { TextField } from '@radix-ui/themes';
import { type HTMLInputAutoCompleteAttribute, type ReactNode, use, useId, useState } from 'react';
import { FormContext } from './form.tsx';
import { PassRule } from './pass-rule.tsx';

interface FormFieldProps {
  name: string;
  label: ReactNode;
  type?: 'text' | 'email' | 'password' | 'search' | 'date';
  hint?: ReactNode;
  required?: boolean;
  /** Said when a required field is empty. */
  missing?: string;
  /** Said when a pattern is not met. */
  wrong?: string;
  pattern?: string;
  maxLength?: number;
  autoComplete?: HTMLInputAutoCompleteAttribute;
  inputMode?: 'text' | 'numeric' | 'decimal' | 'email';
  placeholder?: string;
  defaultValue?: string;
  spellCheck?: boolean;
  autoCapitalize?: 'none' | 'characters' | 'words';
  className?: string;
  value?: string;
  onValue?: (value: string) => void;
  /** The id of one more element that describes the entry. */
  describedBy?: string;
  children?: ReactNode;
}

/** Label, entry, hint and, when something is wrong, what is wrong. Stands in a `Form`. */
export function FormField({ label, hint, missing, wrong, children, ...props }: FormFieldProps) {
  const { onValue, className, describedBy, ...input } = props;
  const id = useId();
  const error = use(FormContext)[props.name];
  const described = [error && `${id}-error`, hint && `${id}-hint`, describedBy]
    .filter(Boolean)
    .join(' ');
  return (
    <div className={error ? 'field wrong' : 'field'}>
      <label className="field-label" htmlFor={id}>
        {label}
      </label>
      <TextField.Root
        {...input}
        id={id}
        className={`entry ${className ?? ''}`}
        data-missing={missing}
        data-wrong={wrong}
        aria-invalid={error ? true : undefined}
        aria-describedby={described || undefined}
        onChange={onValue && ((event) => onValue(event.target.value))}
      >
        {children}
      </TextField.Root>
      {hint && (
        <span className="field-hint" id={`${id}-hint`}>
          {hint}
        </span>
      )}
      {error && (
        <span className="field-error" id={`${id}-error`}>
          {error}
        </span>
      )}
    </div>
  );
}

interface PassphraseFieldProps {
  name: string;
  label: string;
  /** A new one shows the rule of fifteen divisions. */
  isNew?: boolean;
  hint?: ReactNode;
  /** Why what stands there is refused, though it is long enough. */
  refusal?: string | null | undefined;
  onValue?: (value: string) => void;
}

/** A passphrase: may be pasted, may be shown. */
export function PassphraseField({ name, label, isNew = false, ...props }: PassphraseFieldProps) {
  const [value, setValue] = useState('');
  const [shown, setShown] = useState(false);
  const ruleId = useId();
  const isRefused = use(FormContext)[name] !== undefined;
  const characters = [...value.normalize('NFC')].length;
  return (
    <>
      <FormField
        name={name}
        label={label}
        type={shown ? 'text' : 'password'}
        autoComplete={isNew ? 'new-password' : 'current-password'}
        autoCapitalize="none"
        spellCheck={false}
        required
        missing={isNew ? 'Choose a passphrase.' : 'Type your passphrase.'}
        maxLength={200}
        value={value}
        hint={props.hint}
        {...(isNew && { describedBy: ruleId })}
        onValue={(typed) => {
          setValue(typed);
          props.onValue?.(typed);
        }}
      >
        <TextField.Slot side="right">
          <button
            type="button"
            className="text-button"
            aria-pressed={shown}
            onClick={() => setShown(!shown)}
          >
            {shown ? 'Hide' : 'Show'} <span className="visually-hidden">{label.toLowerCase()}</span>
          </button>
        </TextField.Slot>
      </FormField>
      {isNew && !isRefused && <PassRule length={characters} id={ruleId} refusal={props.refusal} />}
    </>
  );
}
