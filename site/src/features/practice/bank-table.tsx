import { Link } from 'react-router-dom';
import { sayDate } from '../../ui/dates.ts';
import { Terminal, type TerminalState } from '../../ui/symbols/terminal.tsx';
import { upperFirst } from '../../ui/words.ts';
import { bySubject, type State, stateOf } from './filter.ts';
import { type BankQuestion, type BankView } from './queries.ts';
import { levelNames, sayKinds } from './words.ts';

interface BankTableProps {
  questions: readonly BankQuestion[];
  /** Of the school: a question under another practice says so. */
  profile: BankView['profile'];
}

const terminals: Record<State, TerminalState> = { shown: 'done', tried: 'begun', open: 'open' };

/** The questions, subject by subject, with what one has shown of each. */
export function BankTable({ questions, profile }: BankTableProps) {
  return (
    <table className="bank-table">
      <caption className="visually-hidden">Practice questions</caption>
      <thead>
        <tr>
          <th scope="col">Question</th>
          <th scope="col">Level</th>
          <th scope="col">Asks for</th>
          <th scope="col">Sheet</th>
          <th scope="col" className="number">
            Marks
          </th>
          <th scope="col">Shown</th>
        </tr>
      </thead>
      {[...bySubject(questions)].map(([code, ofSubject]) => (
        <tbody key={code}>
          <tr className="bank-subject">
            <th scope="rowgroup" colSpan={6}>
              {upperFirst(ofSubject[0]?.subject.name ?? '')}
            </th>
          </tr>
          {ofSubject.map((question) => (
            <QuestionRow key={question.slug} question={question} profile={profile} />
          ))}
        </tbody>
      ))}
    </table>
  );
}

interface QuestionRowProps {
  question: BankQuestion;
  profile: BankView['profile'];
}

function QuestionRow({ question, profile }: QuestionRowProps) {
  const { slug, title, level, lesson, marks } = question;
  return (
    <tr>
      <th scope="row">
        <Link to={`/practice/${slug}`}>{title}</Link>
      </th>
      <td className="bank-level">{levelNames[level]}</td>
      <td className="bank-kinds">
        {sayKinds(question)}
        {question.profile !== profile && (
          <small>{question.profile === 'awg' ? 'AWG practice' : 'Metric practice'}</small>
        )}
      </td>
      <td className="bank-sheet">{lesson}</td>
      <td className="number bank-marks">
        {marks}
        <span className="marks-word"> {marks === 1 ? 'mark' : 'marks'}</span>
      </td>
      <td className="bank-state">
        <span>
          <Terminal state={terminals[stateOf(question)]} width={40} />
          {sayState(question)}
        </span>
      </td>
    </tr>
  );
}

function sayState(question: BankQuestion): string {
  const { best, tries } = question;
  const state = stateOf(question);
  if (state === 'open') return 'not tried';
  if (state === 'shown' && best) return sayDate(best.on);
  const times = tries === 1 ? 'tried once' : `tried ${tries} times`;
  return best ? `${times}, best ${best.percent}\u2009%` : times;
}
