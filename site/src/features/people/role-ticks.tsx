import { type PersonView, type Role } from '../../api/views.ts';
import { TickBox } from '../../ui/choice-row.tsx';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { useSetRole } from './mutations.ts';

const roles: { role: Role; label: string; may: string }[] = [
  { role: 'trainee', label: 'Trainee', may: 'studies, works worksheets, sits papers' },
  { role: 'trainer', label: 'Trainer', may: 'sees their classes and opens marked worksheets' },
  {
    role: 'certification-manager',
    label: 'Certification manager',
    may: 'sees results of papers; each look at an answer is recorded',
  },
  {
    role: 'administrator',
    label: 'Administrator',
    may: 'people, withdrawing and correcting certificates; needs a second step',
  },
];

interface RoleTicksProps {
  person: PersonView;
  isSelf: boolean;
}

export function RoleTicks({ person, isSelf }: RoleTicksProps) {
  const setRole = useSetRole(person.id);
  const waiting = setRole.isPending ? setRole.variables : null;
  return (
    <section aria-busy={setRole.isPending || undefined}>
      <h3>Roles</h3>
      <ProblemCallout error={setRole.error} />
      {roles.map(({ role, label, may }) => (
        <TickBox
          key={role}
          label={<b>{label}</b>}
          hint={may}
          checked={waiting?.role === role ? waiting.given : person.roles.includes(role)}
          disabled={setRole.isPending || (isSelf && role === 'administrator')}
          onChange={(given) => setRole.mutate({ role, given })}
        />
      ))}
    </section>
  );
}
