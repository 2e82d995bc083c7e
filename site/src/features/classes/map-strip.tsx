import { type ReactNode } from 'react';
import { sayStrip } from './class-words.ts';
import { type ClassView, type MemberView } from './queries.ts';
import { type DotState, layStrip, narrowStrip, type StripSize, wideStrip } from './strip-layout.ts';

interface MapStripProps {
  view: ClassView;
  member: MemberView;
}

/** One trainee's way through the course, on one line. */
export function MapStrip({ view, member }: MapStripProps) {
  const said = sayStrip(view, member);
  return (
    <span role="img" aria-label={said}>
      <Strip view={view} member={member} size={wideStrip} className="only-wide" />
      <Strip view={view} member={member} size={narrowStrip} className="only-narrow" />
    </span>
  );
}

function Strip({ view, member, size, className }: MapStripProps & StripProps) {
  const { units, paperX, width } = layStrip(view.units, member, size);
  const y = size.height / 2;
  return (
    <svg
      className={`map-strip ${className}`}
      viewBox={`0 0 ${width} ${size.height}`}
      width={width}
      height={size.height}
    >
      {units.map((unit) => (
        <g key={unit.number}>
          <path className="strip-line" d={`M${unit.from} ${y}H${unit.to}`} />
          {unit.liveTo !== null && (
            <path className="strip-line live" d={`M${unit.from} ${y}H${unit.liveTo}`} />
          )}
          {unit.dots.map((dot) => (
            <Dot key={dot.x} x={dot.x} y={y} radius={size.dot} state={dot.state} />
          ))}
          {unit.lamp && <StripLamp {...unit.lamp} y={y} radius={size.lamp} />}
        </g>
      ))}
      <PaperMark x={paperX} y={y} half={size.dot + 1} state={member.paper} />
    </svg>
  );
}

interface StripProps {
  size: StripSize;
  className: string;
}

interface Spot {
  x: number;
  y: number;
}

function Dot({ x, y, radius, state }: Spot & { radius: number; state: DotState }) {
  return (
    <>
      <circle className={`strip-dot ${state}`} cx={x} cy={y} r={radius} />
      {state === 'begun' && <circle className="strip-core" cx={x} cy={y} r={radius * 0.36} />}
    </>
  );
}

type LampState = MemberView['units'][number]['lamp'];

function StripLamp({ x, y, radius, state }: Spot & { radius: number; state: LampState }) {
  const arm = radius * 0.707;
  const stroke = `M${x - arm} ${y - arm}L${x + arm} ${y + arm}`;
  const cross = `${stroke}M${x - arm} ${y + arm}L${x + arm} ${y - arm}`;
  return (
    <g className={`strip-lamp ${state}`}>
      <circle cx={x} cy={y} r={radius} />
      <path d={state === 'not-passed' ? stroke : cross} />
    </g>
  );
}

function PaperMark({ x, y, half, state }: Spot & { half: number; state: MemberView['paper'] }) {
  const box = `M${x - half} ${y - half}H${x + half}V${y + half}H${x - half}Z`;
  return (
    <g className={`strip-paper ${state}`}>
      <path d={box} />
      {state === 'sitting' && (
        <path
          className="half"
          d={`M${x - half} ${y + half}L${x + half} ${y - half}V${y + half}Z`}
        />
      )}
      {state === 'not-passed' && (
        <path className="struck" d={`M${x - half} ${y - half}L${x + half} ${y + half}`} />
      )}
    </g>
  );
}

/** The numbers of the units over their strips. */
export function StripHead({ view }: { view: ClassView }) {
  const { units, paperX, width } = layStrip(view.units, null, wideStrip);
  return (
    <svg className="map-strip head" viewBox={`0 0 ${width} 18`} width={width} height="18">
      {units.map(({ number, from }) => (
        <text key={number} x={from - wideStrip.dot} y="14">
          {number}
        </text>
      ))}
      <text x={paperX - wideStrip.dot} y="14">
        P
      </text>
    </svg>
  );
}

/** What the strips are drawn with. */
export function StripKey() {
  return (
    <ul className="strip-key" aria-label="Key to symbols">
      <KeyEntry label="sheet done">
        <Dot x={9} y={9} radius={4.6} state="done" />
      </KeyEntry>
      <KeyEntry label="begun">
        <Dot x={9} y={9} radius={4.6} state="begun" />
      </KeyEntry>
      <KeyEntry label="worksheet passed">
        <StripLamp x={9} y={9} radius={7.5} state="lit" />
      </KeyEntry>
      <KeyEntry label="worksheet not passed">
        <StripLamp x={9} y={9} radius={7.5} state="not-passed" />
      </KeyEntry>
      <KeyEntry label="paper passed">
        <PaperMark x={9} y={9} half={5.6} state="passed" />
      </KeyEntry>
      <KeyEntry label="being sat">
        <PaperMark x={9} y={9} half={5.6} state="sitting" />
      </KeyEntry>
      <KeyEntry label="paper not passed">
        <PaperMark x={9} y={9} half={5.6} state="not-passed" />
      </KeyEntry>
    </ul>
  );
}

function KeyEntry({ label, children }: { label: string; children: ReactNode }) {
  return (
    <li>
      <svg className="map-strip" viewBox="0 0 18 18" width="18" height="18" aria-hidden="true">
        {children}
      </svg>
      {label}
    </li>
  );
}
