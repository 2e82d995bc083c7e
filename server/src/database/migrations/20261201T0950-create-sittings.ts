export const createSittings = {
  name: '20261201T0950-create-sittings',
  sql: `
CREATE TABLE schemes (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  slug text NOT NULL,
  revision text NOT NULL,
  title text NOT NULL,
  scope jsonb NOT NULL,
  limits jsonb NOT NULL,
  valid_years integer NOT NULL CONSTRAINT schemes_valid_years CHECK (valid_years BETWEEN 1 AND 10),
  zone text NOT NULL,
  published_at timestamptz NOT NULL DEFAULT now(),
  CONSTRAINT schemes_once UNIQUE (slug, revision)
);
CREATE TRIGGER schemes_immutable BEFORE UPDATE OR DELETE ON schemes
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

CREATE TABLE time_allowances (
  id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
  account_id uuid NOT NULL REFERENCES accounts (id),
  percent integer NOT NULL CONSTRAINT time_allowances_percent CHECK (percent BETWEEN 0 AND 300),
  reason text NOT NULL,
  granted_by uuid NOT NULL REFERENCES accounts (id),
  granted_at timestamptz NOT NULL
);
CREATE INDEX time_allowances_by_account ON time_allowances (account_id, id DESC);
CREATE TRIGGER time_allowances_append_only BEFORE UPDATE OR DELETE ON time_allowances
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

CREATE TABLE sittings (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  account_id uuid NOT NULL REFERENCES accounts (id),
  paper_slug text NOT NULL,
  blueprint_revision_id uuid NOT NULL REFERENCES content_revisions (id),
  scheme_id uuid NOT NULL REFERENCES schemes (id),
  rules jsonb NOT NULL,
  agreement_hash bytea NOT NULL,
  given_name text NOT NULL,
  family_name text NOT NULL,
  writing_session_id uuid REFERENCES sessions (id),
  started_at timestamptz NOT NULL,
  closes_at timestamptz NOT NULL,
  handed_in_at timestamptz,
  handed_in_how text CONSTRAINT sittings_handed_in_how CHECK (handed_in_how IN ('by-candidate', 'at-the-deadline')),
  CONSTRAINT sittings_close_after_start CHECK (closes_at > started_at),
  CONSTRAINT sittings_handed_in_says_how CHECK ((handed_in_at IS NULL) = (handed_in_how IS NULL))
);
CREATE UNIQUE INDEX sittings_one_open_per_person ON sittings (account_id) WHERE handed_in_at IS NULL;
CREATE INDEX sittings_by_account ON sittings (account_id, started_at DESC);
CREATE INDEX sittings_past_their_time ON sittings (closes_at) WHERE handed_in_at IS NULL;

CREATE FUNCTION keep_sitting() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' OR OLD.handed_in_at IS NOT NULL THEN
    RAISE EXCEPTION 'a closed sitting is never changed' USING ERRCODE = 'restrict_violation';
  END IF;
  IF NEW.closes_at < OLD.closes_at
     OR (to_jsonb(NEW) - '{writing_session_id,closes_at,handed_in_at,handed_in_how}'::text[])
        IS DISTINCT FROM
        (to_jsonb(OLD) - '{writing_session_id,closes_at,handed_in_at,handed_in_how}'::text[]) THEN
    RAISE EXCEPTION 'the terms of a sitting are fixed at its start' USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
CREATE TRIGGER sittings_kept BEFORE UPDATE OR DELETE ON sittings FOR EACH ROW EXECUTE FUNCTION keep_sitting();

CREATE TABLE sitting_items (
  sitting_id uuid NOT NULL REFERENCES sittings (id),
  key text NOT NULL,
  number integer NOT NULL,
  question_revision_id uuid NOT NULL REFERENCES content_revisions (id),
  subject text NOT NULL,
  marks integer NOT NULL,
  drawn jsonb NOT NULL,
  PRIMARY KEY (sitting_id, key),
  CONSTRAINT sitting_items_numbered UNIQUE (sitting_id, number)
);
CREATE TRIGGER sitting_items_immutable BEFORE UPDATE OR DELETE ON sitting_items
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

CREATE TABLE sitting_answers (
  id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
  sitting_id uuid NOT NULL,
  item_key text NOT NULL,
  part text NOT NULL,
  sequence bigint NOT NULL CONSTRAINT sitting_answers_sequence CHECK (sequence > 0),
  idempotency_key uuid NOT NULL,
  answer jsonb NOT NULL,
  receipt text NOT NULL,
  saved_at timestamptz NOT NULL,
  FOREIGN KEY (sitting_id, item_key) REFERENCES sitting_items (sitting_id, key),
  CONSTRAINT sitting_answers_once UNIQUE (sitting_id, idempotency_key),
  CONSTRAINT sitting_answers_in_sequence UNIQUE (sitting_id, item_key, part, sequence)
);
CREATE TRIGGER sitting_answers_append_only BEFORE UPDATE OR DELETE ON sitting_answers
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

CREATE TABLE sitting_pennants (
  sitting_id uuid NOT NULL,
  item_key text NOT NULL,
  PRIMARY KEY (sitting_id, item_key),
  FOREIGN KEY (sitting_id, item_key) REFERENCES sitting_items (sitting_id, key)
);

CREATE TABLE sitting_results (
  sitting_id uuid PRIMARY KEY REFERENCES sittings (id),
  marks integer NOT NULL,
  out_of integer NOT NULL,
  passed boolean NOT NULL,
  by_subject jsonb NOT NULL,
  marked jsonb NOT NULL,
  marker_version integer NOT NULL,
  marked_at timestamptz NOT NULL,
  may_sit_again_at timestamptz,
  CONSTRAINT sitting_results_marks CHECK (marks BETWEEN 0 AND out_of)
);
CREATE TRIGGER sitting_results_append_only BEFORE UPDATE OR DELETE ON sitting_results
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

CREATE TABLE item_looks (
  id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
  sitting_id uuid NOT NULL REFERENCES sittings (id),
  account_id uuid NOT NULL REFERENCES accounts (id),
  reason text NOT NULL,
  at timestamptz NOT NULL DEFAULT now()
);
CREATE TRIGGER item_looks_append_only BEFORE UPDATE OR DELETE ON item_looks
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

GRANT SELECT ON schemes TO ferrule_web;
GRANT SELECT, INSERT, UPDATE ON sittings TO ferrule_web;
GRANT SELECT, INSERT ON time_allowances, sitting_items, sitting_answers, sitting_results, item_looks
  TO ferrule_web;
GRANT SELECT, INSERT, DELETE ON sitting_pennants TO ferrule_web;
`,
};
