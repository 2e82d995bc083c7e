import { Link } from 'react-router-dom';
import { sayDayAndMonth } from '../../ui/dates.ts';
import { OpenRingSign } from '../../ui/symbols/signs.tsx';
import { isStuck, nameOf } from './class-words.ts';
import { MapStrip, StripHead } from './map-strip.tsx';
import { type ClassView, type MemberView } from './queries.ts';

interface MembersTableProps {
  view: ClassView;
  members: MemberView[];
  /** Where the marked worksheets of one trainee are shown. */
  linkTo: (memberId: string) => string;
}

/** One row a trainee: the course map on its side, where they are, and since when. */
export function MembersTable({ view, members, linkTo }: MembersTableProps) {
  return (
    <table className="members">
      <caption className="visually-hidden">Trainees and how far they are</caption>
      <thead>
        <tr>
          <th scope="col">Trainee</th>
          <th scope="col" className="member-map">
            <span className="visually-hidden">Course map by unit</span>
            <span aria-hidden="true">
              <StripHead view={view} />
            </span>
          </th>
          <th scope="col">At</th>
          <th scope="col" className="number">
            Days there
          </th>
          <th scope="col" className="number">
            Last here
          </th>
        </tr>
      </thead>
      <tbody>
        {members.map((member) => (
          <MemberRow key={member.id} view={view} member={member} to={linkTo(member.id)} />
        ))}
      </tbody>
    </table>
  );
}

interface MemberRowProps {
  view: ClassView;
  member: MemberView;
  to: string;
}

function MemberRow({ view, member, to }: MemberRowProps) {
  const stuck = isStuck(member);
  const [sheet = '', ...title] = member.at.split(' ');
  return (
    <tr className={stuck ? 'stuck' : undefined}>
      <th scope="row" className="member-name">
        <Link to={to} preventScrollReset>
          {nameOf(member)}
        </Link>
      </th>
      <td className="member-map">
        <MapStrip view={view} member={member} />
      </td>
      <td className="member-at">
        {/^\d/.test(sheet) ? (
          <>
            <b>{sheet}</b> {title.join(' ')}
          </>
        ) : (
          member.at
        )}
      </td>
      <td className="number member-days">
        {stuck && <OpenRingSign />}
        {member.daysThere}
        <span className="with-unit"> {member.daysThere === 1 ? 'day' : 'days'}</span>
      </td>
      <td className="number member-seen">
        {member.lastSeenOn ? (
          <>
            <span className="with-unit">last here </span>
            {sayDayAndMonth(member.lastSeenOn)}
          </>
        ) : (
          'never here'
        )}
      </td>
    </tr>
  );
}
