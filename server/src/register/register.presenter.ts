import type { CertificateRecord } from '../certificates/certificate.ts';
import type { RegisterAnswer } from './register.schemas.ts';

const MINUTE_MS = 60_000;

/** To the minute: two answers of the same minute that say the same are the same bytes. */
const toTheMinute = (instant: Date) =>
  new Date(Math.floor(instant.getTime() / MINUTE_MS) * MINUTE_MS).toISOString();

/** The one answer for an unknown number, a wrong name, an unknown code and an unknown file. */
export function notOnRegister(now: Date): RegisterAnswer {
  return { answer: 'not-on-register', checkedAt: toTheMinute(now), certificate: null };
}

export function presentAnswer(record: CertificateRecord | null, now: Date): RegisterAnswer {
  if (!record) return notOnRegister(now);
  const { number, holderName, scheme, howSat, issuedOn, expiresOn, state, withdrawn } = record;
  return {
    answer: state,
    checkedAt: toTheMinute(now),
    certificate: {
      ...{ number, scheme, howSat, issuedOn, expiresOn },
      holderName: withdrawn ? null : holderName,
      scope: [...record.scope],
      limits: [...record.limits],
      withdrawnOn: withdrawn?.on ?? null,
    },
  };
}
