import { StepFailed } from './processes.mjs';

const needed = { major: 20, minor: 19 };

/** Stops on a Node.js the project cannot run on; says so when it is one nobody tried. */
export function checkNodeVersion(report, version = process.versions.node) {
  const [major, minor] = version.split('.').map(Number);
  const isOlder = major < needed.major || (major === needed.major && minor < needed.minor);
  if (isOlder) {
    throw new StepFailed(
      `Node.js ${needed.major}.${needed.minor} or a later ${needed.major} is needed; this is ${version}.`,
    );
  }
  if (major > needed.major) report(`made for Node.js ${needed.major}; ${version} is not tried`);
  return version;
}
