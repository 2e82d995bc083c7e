export const askRecall = {
  name: '20261201T1840-ask-recall',
  sql: `
-- Recall questions shown at the end of an attempt; attempts started before there were any have none.
ALTER TABLE worksheet_attempts ADD COLUMN recall jsonb NOT NULL DEFAULT '[]'
  CONSTRAINT worksheet_attempts_recall_listed CHECK (jsonb_typeof(recall) = 'array');
`,
};
