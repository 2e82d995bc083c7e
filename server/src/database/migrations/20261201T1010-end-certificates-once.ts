export const endCertificatesOnce = {
  name: '20261201T1010-end-certificates-once',
  sql: `
CREATE UNIQUE INDEX certificate_events_one_end ON certificate_events (certificate_id)
  WHERE kind IN ('withdrawn', 'superseded');
CREATE INDEX certificates_by_issue ON certificates (issued_at DESC, id DESC);
`,
};
