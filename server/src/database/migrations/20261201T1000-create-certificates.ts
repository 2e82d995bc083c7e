export const createCertificates = {
  name: '20261201T1000-create-certificates',
  sql: `
CREATE TABLE decisions (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  account_id uuid NOT NULL REFERENCES accounts (id),
  scheme_id uuid NOT NULL REFERENCES schemes (id),
  sitting_id uuid REFERENCES sittings (id),
  outcome text NOT NULL CONSTRAINT decisions_outcome CHECK (outcome IN ('certify', 'correct-name')),
  decided_by text NOT NULL,
  decider_id uuid REFERENCES accounts (id),
  evidence jsonb NOT NULL,
  rules jsonb NOT NULL,
  decided_at timestamptz NOT NULL,
  CONSTRAINT decisions_one_per_sitting UNIQUE (sitting_id)
);
CREATE TRIGGER decisions_append_only BEFORE UPDATE OR DELETE ON decisions
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

CREATE TABLE issuer_certificates (
  key_id text PRIMARY KEY,
  kind text NOT NULL CONSTRAINT issuer_certificates_kind CHECK (kind IN ('root', 'leaf')),
  pem text NOT NULL,
  valid_from timestamptz NOT NULL,
  valid_to timestamptz NOT NULL,
  retired_at timestamptz,
  compromised_at timestamptz
);

CREATE TABLE certificates (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  number text NOT NULL,
  link_code text NOT NULL CONSTRAINT certificates_link_code_length CHECK (length(link_code) >= 22),
  account_id uuid NOT NULL REFERENCES accounts (id),
  decision_id uuid NOT NULL REFERENCES decisions (id),
  scheme_id uuid NOT NULL REFERENCES schemes (id),
  holder_name text NOT NULL,
  family_fold text NOT NULL,
  how_sat text NOT NULL,
  issued_at timestamptz NOT NULL,
  issued_on date NOT NULL,
  expires_on date NOT NULL,
  CONSTRAINT certificates_one_per_number UNIQUE (number),
  CONSTRAINT certificates_one_per_link UNIQUE (link_code),
  CONSTRAINT certificates_one_per_decision UNIQUE (decision_id),
  CONSTRAINT certificates_expire_after_issue CHECK (expires_on > issued_on)
);
CREATE INDEX certificates_by_account ON certificates (account_id);
CREATE TRIGGER certificates_append_only BEFORE UPDATE OR DELETE ON certificates
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

CREATE TABLE certificate_files (
  certificate_id uuid PRIMARY KEY REFERENCES certificates (id),
  key_id text NOT NULL REFERENCES issuer_certificates (key_id),
  pdf bytea NOT NULL,
  sha256 bytea NOT NULL,
  signed_at timestamptz NOT NULL,
  CONSTRAINT certificate_files_one_per_hash UNIQUE (sha256)
);
CREATE TRIGGER certificate_files_append_only BEFORE UPDATE OR DELETE ON certificate_files
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

CREATE TABLE certificate_events (
  id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
  certificate_id uuid NOT NULL REFERENCES certificates (id),
  kind text NOT NULL CONSTRAINT certificate_events_kind CHECK (kind IN ('issued', 'withdrawn', 'superseded')),
  reason text NOT NULL,
  actor_id uuid REFERENCES accounts (id),
  replaced_by uuid REFERENCES certificates (id),
  at timestamptz NOT NULL,
  CONSTRAINT certificate_events_once UNIQUE (certificate_id, kind),
  CONSTRAINT certificate_events_replacement CHECK ((kind = 'superseded') = (replaced_by IS NOT NULL))
);
CREATE TRIGGER certificate_events_append_only BEFORE UPDATE OR DELETE ON certificate_events
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

ALTER TABLE mail_messages ADD CONSTRAINT mail_messages_attachment
  FOREIGN KEY (attachment_certificate_id) REFERENCES certificates (id);

GRANT SELECT, INSERT ON decisions, certificates, certificate_files, certificate_events TO ferrule_web;
GRANT SELECT, INSERT ON issuer_certificates TO ferrule_web;
`,
};
