import { strandCentres, strandKinds, strandPatternOf } from '@ferrule/certificates/verify';
import { useEffect, useState } from 'react';

interface StrandMarkProps {
  certificateNumber: string;
  tone?: 'verdigris' | 'copper' | 'grey' | 'reversed';
  struck?: boolean;
}

const outerRadius = 100;
const pitch = (outerRadius * 0.86) / 3.42;

const hexagon = (size: number) =>
  `M${Array.from({ length: 6 }, (_, corner) => {
    const angle = (corner * Math.PI) / 3;
    return `${(size * Math.cos(angle)).toFixed(2)} ${(size * Math.sin(angle)).toFixed(2)}`;
  }).join('L')}Z`;

/** An aid to the eye, drawn from the number; the proof is the signature and the register. */
export function StrandMark({
  certificateNumber,
  tone = 'copper',
  struck = false,
}: StrandMarkProps) {
  const [strands, setStrands] = useState<number[]>([]);
  useEffect(() => {
    let isCurrent = true;
    void strandPatternOf(certificateNumber).then((read) => {
      if (isCurrent) setStrands(read);
    });
    return () => {
      isCurrent = false;
    };
  }, [certificateNumber]);
  return (
    <svg
      className={`strand-mark ${tone}`}
      viewBox="-106 -95 212 190"
      role="img"
      aria-label={`Strand mark for certificate ${certificateNumber}`}
    >
      <path className="crimp" d={hexagon(103)} />
      <path className="crimp inner" d={hexagon(96.5)} />
      {strandCentres().map(({ x, y }, index) => (
        <Strand key={index} x={x * pitch} y={y * pitch} kind={strands[index]} />
      ))}
      {struck && <path className="strike" d="M-90 88 90 -88" />}
    </svg>
  );
}

interface StrandProps {
  x: number;
  y: number;
  /** Not known until the number has been hashed. */
  kind: number | undefined;
}

function Strand({ x, y, kind }: StrandProps) {
  const radius = pitch * 0.44;
  if (kind === strandKinds.solid) {
    return <circle className="strand solid" cx={x} cy={y} r={radius * 1.06} />;
  }
  return (
    <>
      <circle className="strand" cx={x} cy={y} r={radius} />
      {kind === strandKinds.ringWithDot && (
        <circle className="strand solid" cx={x} cy={y} r={radius * 0.42} />
      )}
    </>
  );
}

/** Where there is no certificate there are no strands. */
export function EmptyStrandMark() {
  return (
    <svg className="strand-mark grey" viewBox="-106 -95 212 190" aria-hidden="true">
      <path className="crimp none" d={hexagon(103)} />
    </svg>
  );
}
