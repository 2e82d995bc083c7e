/** Collar and crimped tube, tube to the right, in a box of 44 by 20. */
export function FerruleShape() {
  return (
    <>
      <path className="ferrule-collar" d="M.6 .6H5.5L14.4 4.2V15.8L5.5 19.4H.6Z" />
      <path
        className="ferrule-tube"
        d="M14 5H22V7H25.6V5H29.6V7H33.2V5H43.4V15H33.2V13H29.6V15H25.6V13H22V15H14Z"
      />
    </>
  );
}

interface FerruleProps {
  /** Where the tube's tip stands. */
  x: number;
  y: number;
  scale?: number;
}

/** A ferrule pointing left, into a terminal. */
export function Ferrule({ x, y, scale = 1 }: FerruleProps) {
  return (
    <g transform={`translate(${x} ${y}) scale(${-scale} ${scale}) translate(-43 -10)`}>
      <FerruleShape />
    </g>
  );
}
