import { query } from './stack.ts';

/** Ids of what the demonstration holds, for the pages that have one in their address. */
export interface Held {
  markedWorksheet: string;
  /** With a curve of charge beside the marks. */
  markedCurve: string;
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
WITH marked AS (
  SELECT w.id, w.worksheet, a.family_name AS worker
    FROM worksheet_attempts w JOIN accounts a ON a.id = w.account_id
   WHERE w.handed_in_at IS NOT NULL),
named AS (
  SELECT c.id, c.link_code, c.holder_name AS holder, d.decided_at
    FROM certificates c JOIN decisions d ON d.id = c.decision_id),
latest AS (SELECT * FROM named WHERE holder LIKE 'Priya V%' ORDER BY decided_at DESC LIMIT 1)
SELECT
  (SELECT id FROM marked WHERE worker = 'Castellan' AND worksheet = 'W3') AS "markedWorksheet",
  (SELECT id FROM marked WHERE worker = 'Quist' AND worksheet = 'W5') AS "markedCurve",
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
