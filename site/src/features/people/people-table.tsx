import { Link } from 'react-router-dom';
import { sayRoles } from '../../api/role-names.ts';
import { type PersonView } from '../../api/views.ts';
import { sayMoment } from '../../ui/dates.ts';
import { OpenRingSign, StruckSign, TickSign } from '../../ui/symbols/signs.tsx';

interface PeopleTableProps {
  people: PersonView[];
  selectedId: string | null;
  linkTo: (id: string) => string;
}

export function PeopleTable({ people, selectedId, linkTo }: PeopleTableProps) {
  return (
    <table className="people-table">
      <caption className="visually-hidden">People</caption>
      <thead>
        <tr>
          <th>Name</th>
          <th>Roles</th>
          <th>Second step</th>
          <th className="number">Last here</th>
          <th>State</th>
        </tr>
      </thead>
      <tbody>
        {people.map((person) => (
          <tr key={person.id} className={rowClass(person, selectedId)}>
            <td className="person-name">
              <Link
                to={linkTo(person.id)}
                preventScrollReset
                aria-current={person.id === selectedId || undefined}
              >
                {sayName(person)}
              </Link>
              <small>{person.email}</small>
            </td>
            <td className="person-roles">{sayRoles(person.roles)}</td>
            <td className="person-second">
              {person.secondFactor ? 'App code' : <span className="muted">None</span>}
            </td>
            <td className="number person-seen">
              {person.lastSeenAt ? sayMoment(person.lastSeenAt) : 'Not yet'}
            </td>
            <td className="person-state">
              <PersonState person={person} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

export function sayName({ givenName, familyName }: PersonView): string {
  return `${givenName} ${familyName}`.trim();
}

function rowClass(person: PersonView, selectedId: string | null): string | undefined {
  if (person.id === selectedId) return 'selected';
  if (person.suspended) return 'suspended';
  return person.emailConfirmed ? undefined : 'unconfirmed';
}

function PersonState({ person }: { person: PersonView }) {
  if (person.suspended) {
    return (
      <>
        <StruckSign />
        Suspended
      </>
    );
  }
  if (!person.emailConfirmed) {
    return (
      <>
        <OpenRingSign />
        Email to confirm
      </>
    );
  }
  return (
    <>
      <TickSign className="passed" />
      Open
    </>
  );
}
