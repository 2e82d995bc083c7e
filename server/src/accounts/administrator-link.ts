import pg from 'pg';
import { hashToken, newToken, TOKEN_LIFE_MS } from './account-token.ts';

const PURPOSE = 'claim-administrator';

/**
 * A link by which the first administrator opens their account. An older link stops working.
 *
 * @returns null when there is an administrator.
 */
export async function makeAdministratorLink(
  databaseUrl: string,
  publicUrl: string,
): Promise<string | null> {
  const client = new pg.Client({ connectionString: databaseUrl });
  await client.connect();
  try {
    const { rowCount } = await client.query(
      `SELECT 1 FROM account_roles WHERE role = 'administrator' LIMIT 1`,
    );
    if (rowCount) return null;
    const token = newToken();
    await client.query(
      `WITH cancelled AS (
         UPDATE account_tokens SET cancelled_at = now()
          WHERE purpose = $1 AND used_at IS NULL AND cancelled_at IS NULL)
       INSERT INTO account_tokens (purpose, token_hash, expires_at)
       VALUES ($1, $2, now() + $3 * interval '1 millisecond')`,
      [PURPOSE, hashToken(token), TOKEN_LIFE_MS[PURPOSE]],
    );
    return `${new URL(publicUrl).origin}/first-administrator#${token}`;
  } finally {
    await client.end();
  }
}
