export const createAccounts = {
  name: '20261201T0900-create-accounts',
  sql: `
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'rows of % are only ever added', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
END $$;

CREATE TABLE organisations (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  kind text NOT NULL CONSTRAINT organisations_kind CHECK (kind IN ('school', 'employer')),
  name text NOT NULL CONSTRAINT organisations_name_length CHECK (length(name) BETWEEN 1 AND 200),
  address text NOT NULL DEFAULT '',
  created_at timestamptz NOT NULL DEFAULT now()
);

CREATE TABLE accounts (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  email text NOT NULL CONSTRAINT accounts_email_form CHECK (email = lower(email) AND length(email) BETWEEN 3 AND 254),
  given_name text NOT NULL CONSTRAINT accounts_given_name_length CHECK (length(given_name) BETWEEN 1 AND 100),
  family_name text NOT NULL CONSTRAINT accounts_family_name_length CHECK (length(family_name) <= 100),
  password_hash text,
  language text NOT NULL DEFAULT 'en',
  email_confirmed_at timestamptz,
  suspended_at timestamptz,
  suspended_reason text,
  last_seen_at timestamptz,
  created_at timestamptz NOT NULL DEFAULT now(),
  CONSTRAINT accounts_suspension_has_reason CHECK ((suspended_at IS NULL) = (suspended_reason IS NULL))
);
CREATE UNIQUE INDEX accounts_one_per_email ON accounts (email);
CREATE INDEX accounts_by_name ON accounts (family_name, given_name, id);

CREATE TABLE account_roles (
  account_id uuid NOT NULL REFERENCES accounts (id),
  role text NOT NULL CONSTRAINT account_roles_known CHECK (role IN ('trainee', 'trainer', 'certification-manager', 'administrator')),
  granted_by uuid REFERENCES accounts (id),
  granted_at timestamptz NOT NULL DEFAULT now(),
  PRIMARY KEY (account_id, role)
);

CREATE TABLE sessions (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  account_id uuid NOT NULL REFERENCES accounts (id),
  token_hash bytea NOT NULL,
  started_at timestamptz NOT NULL DEFAULT now(),
  last_seen_at timestamptz NOT NULL DEFAULT now(),
  authenticated_at timestamptz NOT NULL DEFAULT now(),
  second_factor_at timestamptz,
  ends_at timestamptz NOT NULL,
  ended_at timestamptz,
  device text NOT NULL DEFAULT '',
  address text NOT NULL DEFAULT ''
);
CREATE INDEX sessions_open_by_account ON sessions (account_id) WHERE ended_at IS NULL;

CREATE TABLE account_tokens (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  account_id uuid REFERENCES accounts (id),
  purpose text NOT NULL CONSTRAINT account_tokens_purpose CHECK (purpose IN
    ('confirm-email', 'reset-password', 'change-email', 'undo-email-change', 'claim-administrator')),
  token_hash bytea NOT NULL,
  email text,
  created_at timestamptz NOT NULL DEFAULT now(),
  expires_at timestamptz NOT NULL,
  used_at timestamptz,
  cancelled_at timestamptz
);
CREATE UNIQUE INDEX account_tokens_by_hash ON account_tokens (token_hash);
CREATE INDEX account_tokens_open ON account_tokens (account_id, purpose) WHERE used_at IS NULL AND cancelled_at IS NULL;

CREATE TABLE second_factors (
  account_id uuid PRIMARY KEY REFERENCES accounts (id),
  secret_sealed bytea,
  pending_sealed bytea,
  created_at timestamptz NOT NULL DEFAULT now(),
  confirmed_at timestamptz,
  last_step bigint,
  CONSTRAINT second_factors_confirmed_with_secret CHECK ((secret_sealed IS NULL) = (confirmed_at IS NULL))
);

CREATE TABLE recovery_codes (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  account_id uuid NOT NULL REFERENCES accounts (id),
  code_hash bytea NOT NULL,
  used_at timestamptz
);
CREATE UNIQUE INDEX recovery_codes_by_hash ON recovery_codes (account_id, code_hash);

CREATE TABLE failed_tries (
  id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
  kind text NOT NULL,
  subject_hash bytea NOT NULL,
  at timestamptz NOT NULL DEFAULT now()
);
CREATE INDEX failed_tries_recent ON failed_tries (kind, subject_hash, at);

CREATE TABLE security_events (
  id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
  at timestamptz NOT NULL DEFAULT now(),
  kind text NOT NULL,
  account_id uuid REFERENCES accounts (id),
  actor_id uuid REFERENCES accounts (id),
  address text NOT NULL DEFAULT '',
  detail jsonb NOT NULL DEFAULT '{}'
);
CREATE INDEX security_events_by_account ON security_events (account_id, at DESC);
CREATE TRIGGER security_events_append_only BEFORE UPDATE OR DELETE ON security_events
  FOR EACH ROW EXECUTE FUNCTION refuse_change();

GRANT SELECT, INSERT, UPDATE ON organisations, accounts, sessions, account_tokens, second_factors, recovery_codes TO ferrule_web;
GRANT SELECT, INSERT, DELETE ON account_roles, failed_tries TO ferrule_web;
GRANT DELETE ON second_factors, recovery_codes TO ferrule_web;
GRANT SELECT, INSERT ON security_events TO ferrule_web;
GRANT SELECT ON schema_migrations TO ferrule_web;
`,
};
