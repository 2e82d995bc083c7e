import { Segments } from '../../ui/choice-row.tsx';
import { chooseScheme, type SchemeChoice, useSchemeChoice } from '../../ui/color-scheme.ts';

const choices: { id: SchemeChoice; label: string }[] = [
  { id: 'system', label: 'As the device' },
  { id: 'light', label: 'Light' },
  { id: 'dark', label: 'Dark' },
];

export function LightOrDark() {
  return (
    <Segments
      name="light-or-dark"
      label="Light or dark"
      segments={choices}
      chosen={useSchemeChoice()}
      onChoose={(id) => chooseScheme(choices.find((choice) => choice.id === id)?.id ?? 'system')}
    />
  );
}
