/** A class as its people and pages know it. */
export interface ClassRecord {
  readonly id: string;
  readonly name: string;
  readonly courseSlug: string;
  readonly school: string;
  readonly joinCode: string;
  /** Calendar days, YYYY-MM-DD. */
  readonly startsOn: string;
  readonly endsOn: string;
}

export interface ListedClass extends ClassRecord {
  readonly members: number;
  readonly trainer: boolean;
}

/** The class a person learns in. */
export interface Enrolment {
  readonly classId: string;
  readonly className: string;
  readonly joinedAt: Date;
  readonly trainers: readonly string[];
}

export interface ClassMember {
  readonly id: string;
  readonly givenName: string;
  readonly familyName: string;
  readonly joinedAt: Date;
  readonly lastSeenAt: Date | null;
}

export interface School {
  readonly name: string;
  readonly address: string;
}

/** "O. Marchetti"; a person of one name is called by it. */
export const shortName = (givenName: string, familyName: string): string =>
  familyName === '' ? givenName : `${[...givenName][0] ?? ''}. ${familyName}`;
