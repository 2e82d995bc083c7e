interface MarkCellsProps {
  marks: number;
  outOf: number;
}

/** A cell for each mark: gained are solid, lost are outlined. */
export function MarkCells({ marks, outOf }: MarkCellsProps) {
  return (
    <span className="mark-cells" role="img" aria-label={`${marks} of ${outOf} marks`}>
      {Array.from({ length: outOf }, (_, index) => (
        <i key={index} className={index < marks ? 'gained' : undefined} />
      ))}
    </span>
  );
}
