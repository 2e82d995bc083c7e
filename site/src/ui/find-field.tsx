import { useEffect, useState } from 'react';

interface FindFieldProps {
  label: string;
  value: string;
  onFind: (typed: string) => void;
}

const restMs = 300;

/** Searches once typing has rested. */
export function FindField({ label, value, onFind }: FindFieldProps) {
  const [typed, setTyped] = useState(value);
  useEffect(() => {
    if (typed === value) return undefined;
    const timer = setTimeout(() => onFind(typed), restMs);
    return () => clearTimeout(timer);
  }, [typed, value, onFind]);
  return (
    <label className="find-field">
      <span className="visually-hidden">{label}</span>
      <input
        className="entry"
        type="search"
        placeholder={label}
        value={typed}
        onChange={(event) => setTyped(event.target.value)}
      />
    </label>
  );
}
