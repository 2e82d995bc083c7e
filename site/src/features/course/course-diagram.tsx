import { sayDate } from '../../ui/dates.ts';
import { Battery, Conductor, TerminalPoint } from '../../ui/symbols/circuit.tsx';
import { Lamp } from '../../ui/symbols/lamp.tsx';
import { RevisedSign } from '../../ui/symbols/signs.tsx';
import { Terminal } from '../../ui/symbols/terminal.tsx';
import { type CourseMapView } from './queries.ts';
import { PaperWay, UnitWay } from './way.tsx';

/** The course as a single-line diagram: source, busbar, a way a unit, a lamp a worksheet. */
export function CourseDiagram({ map }: { map: CourseMapView }) {
  return (
    <section
      className={map.class ? 'course-diagram' : 'course-diagram not-joined'}
      aria-label="Single-line diagram of the course"
    >
      <div className="diagram-head">
        <Source map={map} />
        <Key />
      </div>
      <div className="busbar" aria-hidden="true" />
      <div className="ways">
        {map.units.map((unit) => (
          <UnitWay key={unit.number} unit={unit} currentSheet={map.carryOn?.sheet ?? null} />
        ))}
        {map.paper && <PaperWay paper={map.paper} />}
      </div>
    </section>
  );
}

/** Battery, then the isolator that joining a class closes. The title block says the same. */
function Source({ map }: { map: CourseMapView }) {
  const isClosed = map.class !== null;
  return (
    <svg className="drawing source" viewBox="0 0 420 84" width="420" height="84" aria-hidden="true">
      <Conductor d="M32 20V34M24 34H40M28 39H36M31 44H33M32 20H62" />
      <Battery x={72} y={20} />
      <Conductor d={`M84 20H150${isClosed ? 'M158 20H186' : 'M157 17.5L184 5'}`} />
      <Conductor live d="M194 20H344V84" />
      <TerminalPoint x={154} y={20} />
      <TerminalPoint x={190} y={20} />
      <text className="second" x="52" y="62">
        Enrolled
      </text>
      <text className="bold" x="52" y="79">
        {map.enrolledOn ? sayDate(map.enrolledOn) : 'not yet'}
      </text>
      <text className="second" x="154" y="62">
        Class
      </text>
      <text className="bold" x="154" y="79">
        {map.class ? map.class.name : 'none yet'}
      </text>
    </svg>
  );
}

function Key() {
  return (
    <ul className="diagram-key" aria-label="Key to symbols">
      <li>
        <Terminal state="open" width={53} />
        Not begun
      </li>
      <li>
        <Terminal state="begun" width={53} />
        Begun
      </li>
      <li>
        <Terminal state="done" width={53} />
        Done
      </li>
      <li>
        <RevisedSign letter="C" />
        Revised since you read it
      </li>
      <li>
        <Lamp lit={false} size={26} />
        Worksheet not passed
      </li>
      <li>
        <Lamp lit size={26} />
        Worksheet passed
      </li>
    </ul>
  );
}
