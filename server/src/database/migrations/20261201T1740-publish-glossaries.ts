export const publishGlossaries = {
  name: '20261201T1740-publish-glossaries',
  sql: `
ALTER TABLE content_revisions DROP CONSTRAINT content_revisions_kind;
ALTER TABLE content_revisions ADD CONSTRAINT content_revisions_kind
  CHECK (kind IN ('course', 'lesson', 'question', 'blueprint', 'glossary'));
`,
};
