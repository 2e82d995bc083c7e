export const fadePractice = {
  name: '20261201T1700-fade-practice',
  sql: `
-- How many of the last steps were left to the trainee; null where the question was asked whole.
ALTER TABLE practice_attempts ADD COLUMN steps_left integer
  CONSTRAINT practice_attempts_steps_left CHECK (steps_left BETWEEN 0 AND 1000);
`,
};
