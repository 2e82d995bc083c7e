export const createClasses = {
  name: '20261201T0930-create-classes',
  sql: `
CREATE TABLE classes (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  organisation_id uuid NOT NULL REFERENCES organisations (id),
  course_slug text NOT NULL,
  name text NOT NULL,
  join_code text NOT NULL,
  starts_on date NOT NULL,
  ends_on date NOT NULL,
  created_at timestamptz NOT NULL DEFAULT now(),
  CONSTRAINT classes_ends_after_start CHECK (ends_on >= starts_on)
);
CREATE UNIQUE INDEX classes_one_per_join_code ON classes (join_code);

CREATE TABLE class_trainers (
  class_id uuid NOT NULL REFERENCES classes (id),
  account_id uuid NOT NULL REFERENCES accounts (id),
  PRIMARY KEY (class_id, account_id)
);
CREATE INDEX class_trainers_by_account ON class_trainers (account_id);

CREATE TABLE class_members (
  class_id uuid NOT NULL REFERENCES classes (id),
  account_id uuid NOT NULL REFERENCES accounts (id),
  joined_at timestamptz NOT NULL DEFAULT now(),
  left_at timestamptz,
  PRIMARY KEY (class_id, account_id)
);
CREATE INDEX class_members_by_account ON class_members (account_id);

GRANT SELECT, INSERT, UPDATE ON classes, class_members TO ferrule_web;
GRANT SELECT, INSERT, DELETE ON class_trainers TO ferrule_web;
`,
};
