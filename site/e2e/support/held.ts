import { query } from './stack.ts';

/** Ids of what the demonstration holds, for the pages that have one in their address. */
export interface Held {
  markedWorksheet: string;
  class: string;
  trainee: string;
  failedSitting: string;
  passedSitting: string;
  certificate: string;
  /** The latest of Priya Vandermeer. */
  correctable: string;
  validLink: string;
  expiredLink: string;
  withdrawnLink: string;
}

const heldSql = `
WITH named AS (
  SELECT c.id, c.link_code, c.holder_name AS holder, d.decided_at
    FROM certificates c JOIN decisions d ON d.id = c.decision_id),
latest AS (SELECT * FROM named WHERE holder LIKE 'Priya V%' ORDER BY decided_at DESC LIMIT 1)
SELECT
  (SELECT w.id FROM worksheet_attempts w JOIN accounts a ON a.id = w.account_id
    WHERE a.family_name = 'Castellan' AND w.worksheet = 'W3' AND w.handed_in_at IS NOT NULL
    LIMIT 1) AS "markedWorksheet",
  (SELECT id FROM classes WHERE join_code = 'QUAY-2026') AS "class",
  (SELECT id FROM accounts WHERE family_name = 'Castellan') AS trainee,
  (SELECT s.id FROM sittings s JOIN accounts a ON a.id = s.account_id
    WHERE a.email LIKE 'zoe.nguyen%') AS "failedSitting",
  (SELECT s.id FROM sittings s JOIN accounts a ON a.id = s.account_id
    WHERE a.family_name = 'Quist') AS "passedSitting",
  (SELECT id FROM named WHERE holder = 'Bartholomew Quist') AS certificate,
  (SELECT id FROM latest) AS correctable,
  (SELECT link_code FROM latest) AS "validLink",
  (SELECT link_code FROM named WHERE holder = 'Anselm Tau') AS "expiredLink",
  (SELECT link_code FROM named WHERE holder = 'Emrys Quillfeather') AS "withdrawnLink"`;

export async function findHeld(): Promise<Held> {
  const [held] = await query<Held>(heldSql);
  const missing = Object.entries(held ?? {}).filter(([, id]) => !id);
  if (!held || missing.length > 0) {
    throw new Error(`The demonstration lacks: ${missing.map(([name]) => name).join(', ')}.`);
  }
  return held;
}
