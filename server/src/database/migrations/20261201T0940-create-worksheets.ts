export const createWorksheets = {
  name: '20261201T0940-create-worksheets',
  sql: `
CREATE FUNCTION keep_marked_attempt() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' OR OLD.handed_in_at IS NOT NULL THEN
    RAISE EXCEPTION 'a handed-in attempt is never changed' USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;

CREATE TABLE worksheet_attempts (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  account_id uuid NOT NULL REFERENCES accounts (id),
  worksheet text NOT NULL,
  course_revision_id uuid NOT NULL REFERENCES content_revisions (id),
  attempt integer NOT NULL,
  variant text NOT NULL,
  items jsonb NOT NULL,
  answers jsonb NOT NULL DEFAULT '{}',
  out_of integer NOT NULL,
  started_at timestamptz NOT NULL DEFAULT now(),
  saved_at timestamptz,
  handed_in_at timestamptz,
  marks integer,
  marked jsonb,
  marker_version integer,
  CONSTRAINT worksheet_attempts_numbered UNIQUE (account_id, worksheet, attempt),
  CONSTRAINT worksheet_attempts_marked_when_in CHECK
    ((handed_in_at IS NULL) = (marked IS NULL) AND (handed_in_at IS NULL) = (marks IS NULL)
     AND (handed_in_at IS NULL) = (marker_version IS NULL)),
  CONSTRAINT worksheet_attempts_marks CHECK (marks BETWEEN 0 AND out_of)
);
CREATE UNIQUE INDEX worksheet_attempts_one_open ON worksheet_attempts (account_id, worksheet) WHERE handed_in_at IS NULL;
CREATE TRIGGER worksheet_attempts_kept BEFORE UPDATE OR DELETE ON worksheet_attempts
  FOR EACH ROW EXECUTE FUNCTION keep_marked_attempt();

CREATE TABLE practice_attempts (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  account_id uuid NOT NULL REFERENCES accounts (id),
  question_revision_id uuid NOT NULL REFERENCES content_revisions (id),
  drawn jsonb NOT NULL,
  hints text[] NOT NULL DEFAULT '{}',
  started_at timestamptz NOT NULL DEFAULT now(),
  handed_in_at timestamptz,
  answers jsonb,
  marked jsonb,
  CONSTRAINT practice_attempts_marked_when_in CHECK ((handed_in_at IS NULL) = (marked IS NULL))
);
CREATE INDEX practice_attempts_by_account ON practice_attempts (account_id, started_at DESC);
CREATE TRIGGER practice_attempts_kept BEFORE UPDATE OR DELETE ON practice_attempts
  FOR EACH ROW EXECUTE FUNCTION keep_marked_attempt();

GRANT SELECT, INSERT, UPDATE ON worksheet_attempts, practice_attempts TO ferrule_web;
`,
};
