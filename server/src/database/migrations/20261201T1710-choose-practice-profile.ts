export const choosePracticeProfile = {
  name: '20261201T1710-choose-practice-profile',
  sql: `
ALTER TABLE organisations ADD COLUMN practice_profile text NOT NULL DEFAULT 'metric'
  CONSTRAINT organisations_practice_profile CHECK (practice_profile IN ('metric', 'awg'));
`,
};
