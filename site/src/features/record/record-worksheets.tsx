import { Link } from 'react-router-dom';
import { type Answer } from '../../api/views.ts';
import { sayDate } from '../../ui/dates.ts';

type CourseMap = Answer<'Courses_course'>;
type Worked = NonNullable<CourseMap['units'][number]['worksheet']> & { unit: number };

const workedOf = ({ units }: CourseMap): Worked[] =>
  units.flatMap(({ number, worksheet }) =>
    worksheet && worksheet.attempts > 0 ? [{ ...worksheet, unit: number }] : [],
  );

/** Worksheets one has begun, with the best mark; each opens with all its attempts. */
export function RecordWorksheets({ map }: { map: CourseMap }) {
  const worksheets = workedOf(map);
  if (worksheets.length === 0) {
    return (
      <p>
        None yet. <Link to="/course">Go to the course map</Link>
      </p>
    );
  }
  return (
    <table className="record-table">
      <caption className="visually-hidden">Worksheets</caption>
      <thead>
        <tr>
          <th scope="col">Worksheet</th>
          <th scope="col" className="number">
            Attempts
          </th>
          <th scope="col">Best</th>
        </tr>
      </thead>
      <tbody>
        {worksheets.map((worksheet) => (
          <tr key={worksheet.number}>
            <th scope="row">
              <Link to={`/worksheets/${worksheet.number}`}>
                {worksheet.number}, {worksheet.title}
              </Link>
            </th>
            <td className="number">{worksheet.attempts}</td>
            <td className={worksheet.lit ? 'passed' : undefined}>{sayBest(worksheet)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function sayBest({ best, openAttemptId }: Worked): string {
  if (!best) return openAttemptId ? 'Open, not handed in' : 'Not handed in';
  return `${best.marks} of ${best.outOf}, ${best.percent} %, ${sayDate(best.on)}`;
}
