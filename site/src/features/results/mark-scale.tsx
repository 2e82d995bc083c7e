interface MarkScaleProps {
  marks: number;
  outOf: number;
  passMarks: number;
}

const [left, right, base] = [20, 540, 40];
/** The label stands left of its line when there is no room for it at the right. */
const labelRoom = 70;

/** The marks as a bar on a ruled scale, with the pass mark standing on it. */
export function MarkScale({ marks, outOf, passMarks }: MarkScaleProps) {
  const at = (mark: number) => left + ((right - left) * mark) / outOf;
  const passAt = at(passMarks);
  const labelsLeft = passAt > right - labelRoom;
  return (
    <svg
      className="drawing mark-scale"
      viewBox="0 0 560 74"
      role="img"
      aria-label={`${marks} of ${outOf}; the pass mark is ${passMarks}`}
    >
      <path className="conductor" d={`M${left} ${base}H${right}`} />
      {ticksOf(outOf).map(({ mark, isLong }) => (
        <path
          key={mark}
          className={isLong ? 'conductor' : 'dimension'}
          d={`M${at(mark)} ${base}v${isLong ? 10 : 6}`}
        />
      ))}
      {ticksOf(outOf).map(
        ({ mark, isLong }) =>
          isLong && (
            <text key={mark} x={at(mark)} y={base + 28} textAnchor="middle">
              {mark}
            </text>
          ),
      )}
      {marks > 0 && (
        <path
          className={marks >= passMarks ? 'bar passed' : 'bar'}
          d={`M${left} 36H${at(marks)}`}
        />
      )}
      <path className="pass-line" d={`M${passAt} 12V50`} />
      <text
        className="bold"
        x={passAt + (labelsLeft ? -6 : 6)}
        y="20"
        textAnchor={labelsLeft ? 'end' : 'start'}
      >
        pass, {passMarks}
      </text>
    </svg>
  );
}

/** A short tick for each mark, a long one with its figure every five or ten and at the end. */
function ticksOf(outOf: number): { mark: number; isLong: boolean }[] {
  const step = outOf > 30 ? 10 : 5;
  return Array.from({ length: Math.floor(outOf) + 1 }, (_, mark) => ({
    mark,
    // The last figure would run into one close before it.
    isLong: mark === outOf || (mark % step === 0 && outOf - mark >= step / 2),
  }));
}
