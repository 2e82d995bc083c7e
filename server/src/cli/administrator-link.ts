import { makeAdministratorLink } from '../accounts/administrator-link.ts';

/** Prints the first administrator's link, or nothing when there is an administrator. */
const { DATABASE_URL: databaseUrl, PUBLIC_URL: publicUrl } = process.env;
if (!databaseUrl || !publicUrl) {
  console.error('DATABASE_URL and PUBLIC_URL are needed to make the link.');
  process.exit(1);
}
const link = await makeAdministratorLink(databaseUrl, publicUrl);
if (link !== null) console.log(link);
