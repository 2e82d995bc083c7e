import './mark-cells.css';

interface MarkCellsProps {
  gained: number;
  outOf: number;
  /** "4 of 12 marks" */
  label: string;
}

/** A cell for each: gained are solid, the rest are outlined. */
export function MarkCells({ gained, outOf, label }: MarkCellsProps) {
  return (
    <span className="mark-cells" role="img" aria-label={label}>
      {Array.from({ length: outOf }, (_, index) => (
        <i key={index} className={index < gained ? 'gained' : undefined} />
      ))}
    </span>
  );
}
