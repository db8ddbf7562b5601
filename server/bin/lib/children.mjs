import { spawn } from 'node:child_process';
import { reasonOf } from './failure.mjs';
import { recordOf, sendSignal } from './processes.mjs';

/**
 * @typedef {object} Ending
 * @property {number} code exit code; 127 when the program could not be started, 128 when a signal
 *   ended it
 * @property {string} output what it wrote, when that was captured
 *
 * @typedef {object} ChildOptions
 * @property {string} [cwd]
 * @property {NodeJS.ProcessEnv} [env]
 * @property {number} [uid]
 * @property {number} [gid]
 * @property {'inherit' | 'capture' | { stdout: number, stderr: number }} [output]
 *   where its lines go: to the terminal, into `Ending.output`, or to open files
 * @property {NodeJS.Signals | 'wait'} [stopBy] how it is told to stop; 'wait' lets it finish
 * @property {number} [stopWithin] milliseconds until it is killed
 * @property {boolean} [isAlone] signal the process alone, not the group it leads
 *
 * @typedef {object} Child
 * @property {number} pid 0 when it could not be started
 * @property {Promise<Ending>} ended
 * @property {() => Promise<void>} stop
 *
 * @typedef {object} ChildRecord
 * @property {number} pid
 * @property {string} identity
 * @property {NodeJS.Signals} stopBy
 * @property {boolean} isAlone
 *
 * @typedef {ReturnType<typeof createChildren>} Children
 */

/** Thrown to whoever wants to start something while everything is being stopped. */
export class Stopping extends Error {}

/**
 * Every program that a launcher runs, so that none outlives it. Each leads a group and a session
 * of its own: Ctrl-C reaches the launcher alone, which then stops them in a sensible order.
 */
export function createChildren() {
  /** @type {{ child: Child, record: ChildRecord }[]} */
  const running = [];
  /** @type {() => void} */
  let changed = () => {};
  let isStopping = false;

  /**
   * @param {string} command
   * @param {readonly string[]} args
   * @param {ChildOptions} [options]
   * @returns {Child}
   */
  function start(command, args, options = {}) {
    if (isStopping) throw new Stopping();
    const { child, record } = startChild(command, args, options);
    if (child.pid === 0) return child;
    const entry = { child, record };
    running.push(entry);
    changed();
    void child.ended.then(() => {
      running.splice(running.indexOf(entry), 1);
      changed();
    });
    return child;
  }

  return {
    start,
    /**
     * Runs a program to its end.
     * @param {string} command
     * @param {readonly string[]} args
     * @param {ChildOptions} [options]
     */
    run: (command, args, options) => start(command, args, options).ended,
    /** Stops all, the youngest first. Nothing can be started from here on. */
    stop: async () => {
      isStopping = true;
      for (const { child } of [...running].reverse()) await child.stop();
    },
    isStopping: () => isStopping,
    records: () => running.map(({ record }) => record),
    /** @param {() => void} listener told when something started or ended */
    onChange: (listener) => {
      changed = listener;
    },
  };
}

/**
 * @param {string} command
 * @param {readonly string[]} args
 * @param {ChildOptions} options
 */
function startChild(command, args, options) {
  const { output = 'inherit', stopBy = 'SIGTERM', stopWithin = 10_000, isAlone = false } = options;
  const { cwd, env, uid, gid } = options;
  const made = spawn(command, args, {
    ...{ cwd, env, uid, gid },
    detached: true,
    stdio: stdioFor(output),
  });
  let text = '';
  made.stdout?.on('data', (chunk) => (text += chunk));
  made.stderr?.on('data', (chunk) => (text += chunk));
  /** @type {Promise<Ending>} */
  const ended = new Promise((resolve) => {
    made.once('error', (error) => resolve({ code: 127, output: reasonOf(error) }));
    made.once('close', (code) => resolve({ code: code ?? 128, output: text }));
  });
  const pid = made.pid ?? 0;
  /** @type {ChildRecord} */
  const record = { ...recordOf(pid), stopBy: stopBy === 'wait' ? 'SIGTERM' : stopBy, isAlone };
  const stop = async () => {
    if (stopBy !== 'wait') sendSignal(isAlone ? pid : -pid, stopBy);
    const timer = setTimeout(() => sendSignal(isAlone ? pid : -pid, 'SIGKILL'), stopWithin);
    await ended;
    clearTimeout(timer);
    if (!isAlone) sendSignal(-pid, 'SIGKILL');
  };
  return { child: { pid, ended, stop }, record };
}

/**
 * @param {NonNullable<ChildOptions['output']>} output
 * @returns {import('node:child_process').StdioOptions}
 */
function stdioFor(output) {
  if (output === 'inherit') return ['ignore', 'inherit', 'inherit'];
  if (output === 'capture') return ['ignore', 'pipe', 'pipe'];
  return ['ignore', output.stdout, output.stderr];
}
