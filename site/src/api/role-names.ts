import { type Role } from './views.ts';

const roleNames: Record<Role, string> = {
  trainee: 'Trainee',
  trainer: 'Trainer',
  'certification-manager': 'Certification manager',
  administrator: 'Administrator',
};

export function sayRoles(roles: Role[]): string {
  return roles.map((role) => roleNames[role]).join(', ') || 'None';
}
