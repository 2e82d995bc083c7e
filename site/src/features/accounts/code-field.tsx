import { FormField } from '../../ui/form-field.tsx';

export function CodeField({ label, hint }: { label: string; hint?: string }) {
  return (
    <FormField
      name="code"
      label={label}
      hint={hint}
      autoComplete="one-time-code"
      inputMode={hint ? 'text' : 'numeric'}
      autoCapitalize="none"
      spellCheck={false}
      required
      maxLength={40}
      missing="Type the code."
      className="mono"
    />
  );
}
