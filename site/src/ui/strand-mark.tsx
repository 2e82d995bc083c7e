import { useEffect, useState } from 'react';

interface StrandMarkProps {
  certificateNumber: string;
  tone?: 'verdigris' | 'copper' | 'grey' | 'reversed';
  struck?: boolean;
}

const strandCount = 37;
const outerRadius = 100;
const pitch = (outerRadius * 0.86) / 3.42;

/** Hexagonal lay of 37 strands (1 + 6 + 12 + 18), top row first. */
function layStrands(): { x: number; y: number }[] {
  const lay: { x: number; y: number }[] = [];
  for (let row = -3; row <= 3; row += 1) {
    const inRow = 7 - Math.abs(row);
    for (let place = 0; place < inRow; place += 1) {
      lay.push({ x: pitch * (place - (inRow - 1) / 2), y: pitch * 0.866 * row });
    }
  }
  return lay;
}

/** Two bits a strand of SHA-256 over the certificate number: 0 ring, 1 ring with dot, else solid. */
export async function readStrands(certificateNumber: string): Promise<number[]> {
  const bytes = new TextEncoder().encode(certificateNumber);
  const digest = new Uint8Array(await crypto.subtle.digest('SHA-256', bytes));
  return Array.from({ length: strandCount }, (_, index) => {
    const byte = digest[index >> 1] ?? 0;
    return (byte >> (index % 2 ? 4 : 0)) & 3;
  });
}

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
    void readStrands(certificateNumber).then((read) => {
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
      {layStrands().map(({ x, y }, index) => (
        <Strand key={index} x={x} y={y} fill={strands[index]} />
      ))}
      {struck && <path className="strike" d="M-90 88 90 -88" />}
    </svg>
  );
}

function Strand({ x, y, fill }: { x: number; y: number; fill: number | undefined }) {
  const radius = pitch * 0.44;
  if (fill !== undefined && fill > 1) {
    return <circle className="strand solid" cx={x} cy={y} r={radius * 1.06} />;
  }
  return (
    <>
      <circle className="strand" cx={x} cy={y} r={radius} />
      {fill === 1 && <circle className="strand solid" cx={x} cy={y} r={radius * 0.42} />}
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
