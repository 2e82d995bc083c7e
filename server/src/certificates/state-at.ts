/**
 * SQL for the state of a certificate `c` of the scheme `s` at an instant: the one place where it
 * is worked out. Expiry is the end of a day in the scheme's zone, so the database counts it.
 *
 * @param instant - the bind parameter that holds the instant.
 */
export const stateAt = (instant: `$${number}`): string => `
  CASE WHEN EXISTS (SELECT 1 FROM certificate_events e
                     WHERE e.certificate_id = c.id AND e.kind = 'withdrawn') THEN 'withdrawn'
       WHEN EXISTS (SELECT 1 FROM certificate_events e
                     WHERE e.certificate_id = c.id AND e.kind = 'superseded') THEN 'superseded'
       WHEN c.expires_on < (${instant}::timestamptz AT TIME ZONE s.zone)::date THEN 'expired'
       ELSE 'valid' END`;
