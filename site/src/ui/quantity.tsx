const thinSpace = '\u2009';
const trueMinus = '\u2212';

interface QuantityProps {
  value: string | number;
  unit?: string | null;
}

/** A value and its unit on one line, a thin space between (ISO 80000). */
export function Quantity({ value, unit }: QuantityProps) {
  const figures = String(value).replace(/^-/, trueMinus);
  return <span className="quantity">{unit ? `${figures}${thinSpace}${unit}` : figures}</span>;
}

/** "U_d" as an italic U with an upright d below it. */
export function QuantitySymbol({ text }: { text: string }) {
  const [letter = '', below] = text.split('_');
  return (
    <span className="symbol">
      {letter}
      {below && <sub>{below}</sub>}
    </span>
  );
}
