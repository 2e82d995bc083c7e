export const createContent = {
  name: '20261201T0920-create-content',
  sql: `
CREATE TABLE content_revisions (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  kind text NOT NULL CONSTRAINT content_revisions_kind CHECK (kind IN ('course', 'lesson', 'question', 'blueprint')),
  slug text NOT NULL,
  language text NOT NULL DEFAULT 'en',
  revision text NOT NULL,
  source text NOT NULL,
  hash bytea NOT NULL,
  format_version integer NOT NULL,
  compiled jsonb NOT NULL,
  pool text CONSTRAINT content_revisions_pool CHECK (pool IN ('practice', 'paper')),
  subject text,
  lesson text,
  state text NOT NULL DEFAULT 'current' CONSTRAINT content_revisions_state CHECK (state IN ('current', 'superseded')),
  published_at timestamptz NOT NULL DEFAULT now(),
  CONSTRAINT content_revisions_once UNIQUE (kind, slug, language, revision, format_version),
  CONSTRAINT content_revisions_question_has_pool CHECK (kind <> 'question' OR pool IS NOT NULL)
);
CREATE UNIQUE INDEX content_revisions_one_current ON content_revisions (kind, slug, language) WHERE state = 'current';
CREATE INDEX content_revisions_pools ON content_revisions (pool, subject) WHERE kind = 'question' AND state = 'current';

CREATE FUNCTION keep_published_content() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' THEN
    RAISE EXCEPTION 'published content is never removed' USING ERRCODE = 'restrict_violation';
  END IF;
  IF (to_jsonb(NEW) - 'state') IS DISTINCT FROM (to_jsonb(OLD) - 'state') THEN
    RAISE EXCEPTION 'published content is never changed: publish a new revision' USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
CREATE TRIGGER content_revisions_immutable BEFORE UPDATE OR DELETE ON content_revisions
  FOR EACH ROW EXECUTE FUNCTION keep_published_content();

CREATE TABLE lesson_progress (
  account_id uuid NOT NULL REFERENCES accounts (id),
  lesson text NOT NULL,
  paragraph integer NOT NULL DEFAULT 1 CONSTRAINT lesson_progress_paragraph CHECK (paragraph BETWEEN 1 AND 1000),
  begun_at timestamptz NOT NULL DEFAULT now(),
  last_read_at timestamptz NOT NULL DEFAULT now(),
  done_at timestamptz,
  done_revision text,
  PRIMARY KEY (account_id, lesson),
  CONSTRAINT lesson_progress_done_with_revision CHECK ((done_at IS NULL) = (done_revision IS NULL))
);

GRANT SELECT ON content_revisions TO ferrule_web;
GRANT SELECT, INSERT, UPDATE ON lesson_progress TO ferrule_web;
`,
};
