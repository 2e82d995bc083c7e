import { FormField } from '../../ui/form-field.tsx';

export function NameFields() {
  return (
    <div className="name-pair">
      <FormField
        name="givenName"
        label="Given name"
        autoComplete="given-name"
        autoCapitalize="words"
        required
        maxLength={100}
        missing="Type your name as it should stand on a certificate."
      />
      <FormField
        name="familyName"
        label="Family name"
        autoComplete="family-name"
        autoCapitalize="words"
        maxLength={100}
        hint="Leave it empty if you have one name."
      />
    </div>
  );
}
