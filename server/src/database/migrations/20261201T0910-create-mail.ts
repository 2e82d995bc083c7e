export const createMail = {
  name: '20261201T0910-create-mail',
  sql: `
CREATE TABLE mail_messages (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  dedupe_key text NOT NULL,
  account_id uuid REFERENCES accounts (id),
  recipient text NOT NULL,
  recipient_name text NOT NULL DEFAULT '',
  template text NOT NULL,
  subject text NOT NULL,
  body_text text NOT NULL,
  body_html text NOT NULL,
  attachment_certificate_id uuid,
  state text NOT NULL DEFAULT 'queued' CONSTRAINT mail_messages_state CHECK (state IN ('queued', 'sent', 'failed')),
  tries integer NOT NULL DEFAULT 0,
  last_error text,
  created_at timestamptz NOT NULL DEFAULT now(),
  sent_at timestamptz
);
CREATE UNIQUE INDEX mail_messages_once ON mail_messages (dedupe_key);
CREATE INDEX mail_messages_waiting ON mail_messages (created_at) WHERE state = 'queued';
GRANT SELECT, INSERT, UPDATE ON mail_messages TO ferrule_web;
`,
};
