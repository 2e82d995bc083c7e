import { Link } from 'react-router-dom';
import { sayDate } from '../../ui/dates.ts';
import { Quantity } from '../../ui/quantity.tsx';
import { countDone, paperPath, sayPaper, sayUnitState, unitPath } from './map-words.ts';
import { type CourseMapView, type PaperView, type UnitView } from './queries.ts';

/** The same facts as the diagram, as a table. */
export function Schedule({ map }: { map: CourseMapView }) {
  return (
    <section className="schedule" aria-labelledby="schedule-title">
      <h2 id="schedule-title">Schedule of circuits</h2>
      <table>
        <thead>
          <tr>
            <th scope="col">Way</th>
            <th scope="col">Unit</th>
            <th scope="col" className="number">
              Sheets done
            </th>
            <th scope="col">State</th>
            <th scope="col" className="number">
              Best result
            </th>
            <th scope="col">Date</th>
          </tr>
        </thead>
        <tbody>
          {map.units.map((unit) => (
            <UnitRow key={unit.number} unit={unit} />
          ))}
          {map.paper && <PaperRow paper={map.paper} />}
        </tbody>
      </table>
    </section>
  );
}

function UnitRow({ unit }: { unit: UnitView }) {
  const path = unitPath(unit);
  const best = unit.worksheet?.best ?? null;
  return (
    <tr>
      <td>
        <b>{unit.number}</b>
      </td>
      <td>{path ? <Link to={path}>{unit.title}</Link> : unit.title}</td>
      <td className={unit.issued ? 'number sheets-done' : 'number'}>
        {unit.issued ? `${countDone(unit)} of ${unit.sheets.length}` : <None />}
      </td>
      <td>{sayUnitState(unit)}</td>
      <td className="number">
        {best ? (
          <b className={unit.worksheet?.lit ? 'passed' : undefined}>
            <Quantity value={best.percent} unit="%" />
          </b>
        ) : (
          <None />
        )}
      </td>
      <td className="quantity">{best ? sayDate(best.on) : <None />}</td>
    </tr>
  );
}

function PaperRow({ paper }: { paper: PaperView }) {
  return (
    <tr>
      <td>
        <b>P</b>
      </td>
      <td>
        <Link to={paperPath(paper)}>{paper.title}</Link>
      </td>
      <td className="number">
        <None />
      </td>
      <td className="capital-first">{sayPaper(paper)}</td>
      <td className="number">
        <None />
      </td>
      <td>
        <None />
      </td>
    </tr>
  );
}

function None() {
  return (
    <span className="muted">
      <span aria-hidden="true">–</span>
      <span className="visually-hidden">none</span>
    </span>
  );
}
