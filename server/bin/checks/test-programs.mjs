import { findProgram, installPackages } from '../steps/debian-packages.mjs';
import { findPostgres } from '../steps/postgres-programs.mjs';

const packageOf = {
  chromium: 'chromium',
  pdfsig: 'poppler-utils',
  qpdf: 'qpdf',
  certutil: 'libnss3-tools',
  zbarimg: 'zbar-tools',
  ngspice: 'ngspice',
  units: 'units',
  openssl: 'openssl',
};

/** Installs the programs from outside that the tests ask for a second opinion. */
export async function installTestPrograms(report) {
  const missing = Object.keys(packageOf).filter((program) => !findProgram(program));
  if (missing.length > 0) {
    await installPackages(
      missing.map((program) => packageOf[program]),
      report,
    );
  }
  await findPostgres(report);
  return missing.length > 0 ? `installed ${missing.join(', ')}` : 'unchanged';
}
