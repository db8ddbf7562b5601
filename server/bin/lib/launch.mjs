import { createChildren, Stopping } from './children.mjs';
import { Failure, reasonOf } from './failure.mjs';
import { say } from './say.mjs';

/** @typedef {import('./children.mjs').Children} Children */
/** @typedef {{ code: number, lastLine?: string }} Outcome */

/**
 * @typedef {object} Launch
 * @property {Children} children
 * @property {(task: () => void) => void} atEnd done after all children have stopped, the last
 *   first
 */

const oldestNode = [20, 19];

/**
 * Runs a launcher: whatever way it ends, by itself, by a signal, by a failure or by a bug, all that
 * it started is stopped first.
 * @param {(launch: Launch) => Promise<Outcome>} main
 * @param {{ signalCode: number, failureLine?: string }} options exit code after a signal; what the
 *   last line says after a failure
 */
export async function launch(main, { signalCode, failureLine }) {
  const children = createChildren();
  /** @type {(() => void)[]} */
  const tasks = [];
  /** @type {Promise<never> | null} */
  let ending = null;
  /** @param {Outcome} outcome */
  const end = (outcome) => (ending ??= finish(children, tasks, outcome));
  // A terminal or pipe that is gone must not leave PostgreSQL behind.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      if (ending === null) say(`\nStopping (${signal}).`);
      void end({ code: signalCode });
    });
  }
  process.on('uncaughtException', (error) => {
    complain(error);
    void end({ code: 1, lastLine: failureLine });
  });
  try {
    requireNode();
    await end(await main({ children, atEnd: (task) => tasks.push(task) }));
  } catch (error) {
    if (ending === null && !(error instanceof Stopping)) complain(error);
    await end({ code: 1, lastLine: failureLine });
  }
}

/**
 * @param {Children} children
 * @param {(() => void)[]} tasks
 * @param {Outcome} outcome
 * @returns {Promise<never>}
 */
async function finish(children, tasks, { code, lastLine }) {
  let exitCode = code;
  try {
    await children.stop();
    for (const task of tasks.reverse()) task();
  } catch (error) {
    complain(error);
    exitCode = 1;
  }
  if (lastLine !== undefined) say(lastLine);
  process.exit(exitCode);
}

/** @param {unknown} error */
function complain(error) {
  const text = error instanceof Failure ? reasonOf(error) : bugText(error);
  process.stderr.write(`${text}\n`);
}

/** @param {unknown} error */
function bugText(error) {
  return error instanceof Error && error.stack !== undefined ? error.stack : String(error);
}

function requireNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  const [wantMajor = 0, wantMinor = 0] = oldestNode;
  if (major > wantMajor || (major === wantMajor && minor >= wantMinor)) return;
  throw new Failure(
    `Coldbench needs Node ${oldestNode.join('.')} or newer, not ${major}.${minor}.`,
  );
}
