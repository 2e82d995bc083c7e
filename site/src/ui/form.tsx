import { createContext, type FormEvent, type ReactNode, useEffect, useRef, useState } from 'react';
import { fieldProblems, ProblemError } from '../api/problem.ts';
import { ProblemCallout } from './problem-callout.tsx';

type FieldErrors = Record<string, string>;
export const FormContext = createContext<FieldErrors>({});

interface FormProps {
  children: ReactNode;
  /** The named fields as they stand; a tick box that is not ticked is absent. */
  onSubmit: (values: Record<string, string>) => void;
  /** The last refusal; its field errors go to their fields, the rest is said above. */
  problem?: unknown;
  className?: string;
  label?: string;
}

/** A form that says what is wrong beside the field and moves there. */
export function Form({ children, onSubmit, problem, className, label }: FormProps) {
  const form = useRef<HTMLFormElement>(null);
  const [missing, setMissing] = useState<FieldErrors>({});
  const [edited, setEdited] = useState<readonly string[]>([]);
  const refused = fieldProblems(problem);
  // What is said of a field holds until somebody types in it again.
  const errors = Object.fromEntries(
    Object.entries({ ...refused, ...missing }).filter(([name]) => !edited.includes(name)),
  );

  useEffect(() => {
    form.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus();
  }, [missing, problem]);

  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const wrong = findWrongFields(event.currentTarget);
    setMissing(wrong);
    setEdited([]);
    if (Object.keys(wrong).length > 0) return;
    onSubmit(readFields(event.currentTarget));
  };

  const isFieldProblem = problem instanceof ProblemError && Object.keys(refused).length > 0;
  return (
    <form
      ref={form}
      noValidate
      onSubmit={submit}
      onInput={({ target }) => {
        if (target instanceof Element && isEntry(target)) setEdited([...edited, target.name]);
      }}
      className={className}
      aria-label={label}
    >
      {!isFieldProblem && <ProblemCallout error={problem} />}
      <FormContext value={errors}>{children}</FormContext>
    </form>
  );
}

function readFields(form: HTMLFormElement): Record<string, string> {
  const entries = [...new FormData(form)].filter(
    (entry): entry is [string, string] => typeof entry[1] === 'string',
  );
  return Object.fromEntries(entries);
}

function findWrongFields(form: HTMLFormElement): FieldErrors {
  const wrong: FieldErrors = {};
  for (const field of form.elements) {
    if (isEntry(field) && field.name && !field.validity.valid) {
      wrong[field.name] = sayWhatIsWrong(field);
    }
  }
  return wrong;
}

function isEntry(element: Element): element is HTMLInputElement {
  return (
    element instanceof HTMLInputElement ||
    element instanceof HTMLTextAreaElement ||
    element instanceof HTMLSelectElement
  );
}

function sayWhatIsWrong(field: HTMLInputElement): string {
  if (field.validity.valueMissing) return field.dataset['missing'] ?? 'Fill this in.';
  if (field.validity.typeMismatch && field.type === 'email') {
    return 'That is not an email address. It needs a name, an @ and a domain.';
  }
  return field.dataset['wrong'] ?? field.validationMessage;
}
