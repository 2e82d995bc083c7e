import { Link } from 'react-router-dom';
import { sayDate } from '../../ui/dates.ts';
import { type ListedClass } from './queries.ts';

interface ClassListProps {
  classes: ListedClass[];
  /** An administrator opens every class. */
  opensAll: boolean;
}

export function ClassList({ classes, opensAll }: ClassListProps) {
  return (
    <div className="table-scroll">
      <table className="class-list">
        <thead>
          <tr>
            <th scope="col">Class</th>
            <th scope="col">Course</th>
            <th scope="col">School</th>
            <th scope="col">From</th>
            <th scope="col">To</th>
            <th scope="col">Code to join</th>
            <th scope="col" className="number">
              Trainees
            </th>
          </tr>
        </thead>
        <tbody>
          {classes.map((one) => (
            <tr key={one.id}>
              <th scope="row">
                {one.trainer || opensAll ? (
                  <Link to={`/class/${one.id}`}>{one.name}</Link>
                ) : (
                  one.name
                )}
              </th>
              <td>{one.course}</td>
              <td>{one.school}</td>
              <td className="quantity">{sayDate(one.startsOn)}</td>
              <td className="quantity">{sayDate(one.endsOn)}</td>
              <td className="mono">{one.joinCode ?? ''}</td>
              <td className="number">{one.members}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
