import { existsSync } from 'node:fs';
import { isRoot } from './account.mjs';
import { hasApt, installPackages } from './debian.mjs';
import { Failure } from './failure.mjs';
import { findPrograms, requirePrograms } from './postgres-programs.mjs';
import { findOnPath } from './project.mjs';

/** @typedef {import('./test-steps.mjs').Program} Program */

const macChromium = '/Applications/Chromium.app/Contents/MacOS/Chromium';

/** The browser of the end-to-end tests, or null. */
export function findChromium() {
  const given = process.env['COLDBENCH_E2E_CHROMIUM'];
  if (given) return existsSync(given) ? given : null;
  return (
    findOnPath(['chromium', 'chromium-browser']) ?? (existsSync(macChromium) ? macChromium : null)
  );
}

/** @param {Program} program */
function isPresent(program) {
  switch (program) {
    case 'postgresql':
      return findPrograms().length > 0;
    case 'chromium':
      return findChromium() !== null;
    case 'ngspice':
      return findOnPath(['ngspice']) !== null;
  }
}

/**
 * Sees that these programs are there; root on Debian gets what is missing.
 * @param {import('./children.mjs').Children} children
 * @param {readonly Program[]} programs
 * @throws {Failure} naming all that is missing
 */
export async function requireTestPrograms(children, programs) {
  const missing = () => [...new Set(programs)].filter((program) => !isPresent(program));
  const wanted = missing();
  if (isRoot() && hasApt()) {
    if (wanted.includes('postgresql')) await requirePrograms(children);
    const others = wanted.filter((program) => program !== 'postgresql');
    if (others.length > 0) await installPackages(children, others);
  }
  const lacking = missing();
  if (lacking.length === 0) return;
  throw new Failure(
    `The tests need ${lacking.join(', ')}: on Debian 12, 'sudo apt-get install ${lacking.join(' ')}'.`,
  );
}
