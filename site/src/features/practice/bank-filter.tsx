import { useId } from 'react';
import { Link } from 'react-router-dom';
import { Segments } from '../../ui/choice-row.tsx';
import { FindField } from '../../ui/find-field.tsx';
import { upperFirst } from '../../ui/words.ts';
import { isLevel, type Filter, type SubjectCount } from './filter.ts';
import { levelNames } from './words.ts';

interface BankFilterProps {
  filter: Filter;
  onFilter: (change: Partial<Filter>) => void;
}

/** By level and by title; the subject is chosen beside the list. */
export function BankFilter({ filter, onFilter }: BankFilterProps) {
  return (
    <div className="desk-bar bank-filter">
      <Segments
        name="level"
        label="Level"
        chosen={filter.level ?? ''}
        segments={[
          { id: '', label: 'All levels' },
          ...Object.entries(levelNames).map(([id, label]) => ({ id, label })),
        ]}
        onChoose={(id) => onFilter({ level: isLevel(id) ? id : null })}
      />
      <FindField label="Find a title" value={filter.find} onFind={(find) => onFilter({ find })} />
    </div>
  );
}

interface SubjectsProps {
  subjects: readonly SubjectCount[];
  chosen: string | null;
  pathOf: (subject: string | null) => string;
  onChoose: (subject: string | null) => void;
}

/** The subjects of the bank: a list beside the questions, one field on a phone. */
export function Subjects({ subjects, chosen, pathOf, onChoose }: SubjectsProps) {
  const id = useId();
  return (
    <div className="bank-subjects">
      <nav className="only-wide" aria-label="Subjects">
        <ul>
          <li>
            <Link to={pathOf(null)} aria-current={chosen === null ? 'true' : undefined}>
              All subjects
            </Link>
          </li>
          {subjects.map(({ code, name, shown, questions }) => (
            <li key={code}>
              <Link to={pathOf(code)} aria-current={chosen === code ? 'true' : undefined}>
                <span>{upperFirst(name)}</span>
                <span className="number">
                  {shown}
                  <span aria-hidden="true">/</span>
                  <span className="visually-hidden"> shown of </span>
                  {questions}
                </span>
              </Link>
            </li>
          ))}
        </ul>
      </nav>
      <div className="only-narrow">
        <label htmlFor={id}>Subject</label>
        <select
          id={id}
          className="entry"
          value={chosen ?? ''}
          onChange={(event) => onChoose(event.target.value || null)}
        >
          <option value="">All subjects</option>
          {subjects.map(({ code, name, shown, questions }) => (
            <option key={code} value={code}>
              {upperFirst(name)}, {shown} of {questions} shown
            </option>
          ))}
        </select>
      </div>
    </div>
  );
}
