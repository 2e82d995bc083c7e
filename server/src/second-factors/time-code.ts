import { verify } from 'otplib';

const STEP_S = 30;

/**
 * The time step a code belongs to, or null when it belongs to none that counts now.
 * One step to either side is taken: telephones' clocks differ from the server's.
 *
 * Codes as in RFC 6238: SHA-1, six figures, thirty seconds.
 */
export async function stepOfCode(secret: string, code: string, now: Date): Promise<number | null> {
  if (!/^\d{6}$/.test(code)) return null;
  const result = await verify({
    strategy: 'totp',
    secret,
    token: code,
    epoch: Math.floor(now.getTime() / 1_000),
    epochTolerance: STEP_S,
  });
  return result.valid && 'timeStep' in result ? result.timeStep : null;
}
