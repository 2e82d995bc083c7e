import type { Role } from '../accounts/account.ts';

export interface SeededPerson {
  readonly email: string;
  readonly givenName: string;
  readonly familyName: string;
  readonly roles: readonly Role[];
}

function person(names: [string, string], email: string, ...roles: Role[]): SeededPerson {
  return { email, givenName: names[0], familyName: names[1], roles };
}

const atSchool = (name: string) => `${name}@harrow-quay.example`;
const atHome = (name: string) => `${name}@people.example`;

/** The people of the demonstration whose passphrases the start command prints. All invented. */
export const demonstrationPeople: readonly SeededPerson[] = [
  person(['Ifeoma', 'Castellan'], atHome('ifeoma.castellan'), 'trainee'),
  person(['Iolo', 'Farrant'], atHome('iolo.farrant'), 'trainee'),
  person(['Zoë', 'Nguyễn-Łukasiewicz'], atHome('zoe.nguyen-lukasiewicz'), 'trainee'),
  person(['Bartholomew', 'Quist'], atHome('bartholomew.quist'), 'trainee'),
  person(['Freya', 'Dunmore-Singh'], atHome('freya.dunmore-singh'), 'trainee'),
  person(['Odile', 'Marchetti'], atSchool('odile.marchetti'), 'trainer'),
  person(['Gwilym', 'Asante'], atSchool('gwilym.asante'), 'certification-manager'),
  person(['Marit', 'Oyelaran'], atSchool('marit.oyelaran'), 'administrator'),
  person(['Desmond', 'Feaver'], atSchool('desmond.feaver'), 'administrator'),
];

/** Others the school has on its books; they have no passphrase and cannot sign in. */
export const otherPeople: readonly SeededPerson[] = [
  person(['Ruaridh', 'Nakamura'], atSchool('ruaridh.nakamura'), 'trainer'),
  person(['Blessing', 'Thornquist'], atSchool('blessing.thornquist'), 'trainer'),
  person(['Hemi', 'Tāwhiri-Boyd'], atHome('hemi.tawhiri-boyd'), 'trainee'),
  person(['Oluwaseun', 'Brack'], atHome('oluwaseun.brack'), 'trainee'),
  person(['Signe', 'Holloway'], atHome('signe.holloway'), 'trainee'),
  person(['Caspian', 'Rudd'], atHome('caspian.rudd'), 'trainee'),
  person(['Amadi', 'Thrale'], atHome('amadi.thrale'), 'trainee'),
  person(['Oona', 'Kirkbride'], atHome('oona.kirkbride'), 'trainee'),
  person(['Zuleika', 'Varga'], atHome('zuleika.varga'), 'trainee'),
  person(['Maren', 'Stoddart'], atHome('maren.stoddart'), 'trainee'),
  person(['Priya', 'Vandermeer'], atHome('priya.vandermeer'), 'trainee'),
  person(['Anselm', 'Tau'], atHome('anselm.tau'), 'trainee'),
  person(['Emrys', 'Quillfeather'], atHome('emrys.quillfeather'), 'trainee'),
];

export const demonstrationSchool = {
  name: 'Harrow Quay Technical School',
  address: 'Unit 4, The Old Ropewalk, Harrow Quay, HQ1 4RW',
};

/** The class of the seeded trainees; anyone who signs up may join it with its code. */
export const demonstrationClass = {
  name: 'Autumn class 2026',
  courseSlug: 'hq-dc2',
  joinCode: 'QUAY-2026',
  startsOn: '2026-09-14',
  endsOn: '2026-12-18',
  trainers: ['odile.marchetti', 'ruaridh.nakamura', 'blessing.thornquist'].map(atSchool),
};

/** What the front page shows of them. */
export const roleNames: Record<Role, string> = {
  trainee: 'Trainee',
  trainer: 'Trainer',
  'certification-manager': 'Certification manager',
  administrator: 'Administrator',
};
