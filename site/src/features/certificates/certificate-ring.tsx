/** A lay of the ring: one wavy strand, turned into all its places. */
interface Lay {
  radius: number;
  amplitude: number;
  waves: number;
  strands: number;
}

const outerRadius = 211;
const innerRadius = 142;
const lays: Lay[] = [
  { radius: 176, amplitude: 22, waves: 18, strands: 18 },
  { radius: 202, amplitude: 7, waves: 36, strands: 8 },
  { radius: 149, amplitude: 5, waves: 48, strands: 6 },
];
const pointsPerWave = 12;

function wavyStrand({ radius, amplitude, waves }: Lay): string {
  const count = waves * pointsPerWave;
  const points = Array.from({ length: count }, (_, index) => {
    const angle = (2 * Math.PI * index) / count;
    const r = radius + amplitude * Math.sin(waves * angle);
    return `${(r * Math.cos(angle)).toFixed(1)} ${(r * Math.sin(angle)).toFixed(1)}`;
  });
  return `M${points.join('L')}Z`;
}

const paths = lays.map((lay) => ({ ...lay, path: wavyStrand(lay) }));

/** The rope-lay ring of the certificate. It does not differ between certificates. */
export function CertificateRing() {
  return (
    <svg className="certificate-ring" viewBox="-213 -213 426 426" aria-hidden="true">
      {paths.flatMap(({ path, strands, waves }) =>
        Array.from({ length: strands }, (_, strand) => (
          <path
            key={`${waves} ${strand}`}
            d={path}
            transform={`rotate(${(360 * strand) / (strands * waves)})`}
          />
        )),
      )}
      <circle r={outerRadius} />
      <circle r={innerRadius} />
    </svg>
  );
}
