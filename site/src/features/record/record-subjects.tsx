import { Link } from 'react-router-dom';
import { sayDate } from '../../ui/dates.ts';
import { MarkCells } from '../../ui/mark-cells.tsx';
import { upperFirst } from '../../ui/words.ts';
import { type SubjectRecords } from './queries.ts';

type SubjectRecord = SubjectRecords['subjects'][number];

/** Subject by subject: how many questions were shown whole, and on how many days. */
export function RecordSubjects({ subjects }: { subjects: readonly SubjectRecord[] }) {
  return (
    <table className="record-table record-subjects">
      <caption className="visually-hidden">What has been shown, by subject</caption>
      <thead>
        <tr>
          <th scope="col">Subject</th>
          <th scope="col">Questions shown</th>
          <th scope="col" className="number">
            Days
          </th>
          <th scope="col">Last</th>
        </tr>
      </thead>
      <tbody>
        {subjects.map((subject) => (
          <SubjectRow key={subject.code} subject={subject} />
        ))}
      </tbody>
    </table>
  );
}

function SubjectRow({ subject }: { subject: SubjectRecord }) {
  const { code, name, questions, shown, days, lastDay } = subject;
  return (
    <tr>
      <th scope="row">
        <Link to={`/practice?subject=${code}`}>{upperFirst(name)}</Link>
      </th>
      <td className="shown">
        <span className="quantity">
          <b>{shown}</b> of {questions}
        </span>
        <MarkCells
          gained={shown}
          outOf={questions}
          label={`${shown} of ${questions} questions shown`}
        />
      </td>
      <td className="number days">
        {days}
        <span className="day-word"> {days === 1 ? 'day' : 'days'}</span>
      </td>
      <td className="last-day">{lastDay ? sayDate(lastDay) : 'not yet'}</td>
    </tr>
  );
}
