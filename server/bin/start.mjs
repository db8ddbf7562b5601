import { closeSync } from 'node:fs';
import { join } from 'node:path';
import { requireBuild } from './lib/build.mjs';
import { Failure } from './lib/failure.mjs';
import { awaitHealth } from './lib/health.mjs';
import { launch } from './lib/launch.mjs';
import { lastWordsIn, openLog } from './lib/log-file.mjs';
import { loopback } from './lib/ports.mjs';
import { prepare } from './lib/prepare.mjs';
import { projectFolder } from './lib/project.mjs';
import { say, since } from './lib/say.mjs';
import { readDemoAccounts, welcome } from './lib/welcome.mjs';

// Migrations run before the server answers, and a long table takes its time.
const readyWithin = 120_000;

/**
 * @param {import('./lib/launch.mjs').Launch} launched
 * @returns {Promise<never>} runs until it is stopped
 */
async function start(launched) {
  const begin = performance.now();
  const { children } = launched;
  const { settings, serverEnv, lost } = await prepare(launched, 'npm start', ({ port }) => ({
    PORT: port,
  }));
  await requireBuild(children);
  const address = `http://${loopback}:${settings.port}`;
  const log = join(settings.data, 'server.log');
  const lines = openLog(log);
  const server = children.start(process.execPath, ['--enable-source-maps', 'dist/server/main.js'], {
    cwd: projectFolder,
    env: { ...serverEnv, PORT: String(settings.port), NODE_ENV: 'production' },
    output: { stdout: lines, stderr: lines },
  });
  closeSync(lines);
  const state = await awaitHealth(`${address}/api/health`, readyWithin, server.ended);
  if (state === 'late') throw new Failure(`The server does not answer: see ${log}.`);
  if (state === 'ended') {
    throw new Failure(`The server could not start (${log}): ${lastWordsIn(log)}`);
  }
  const demo = settings.isSeeded ? readDemoAccounts() : null;
  const isOwnDatabase = settings.database !== null;
  welcome({ address, time: since(begin), demo, isOwnDatabase }).forEach(say);
  const ended = server.ended.then(
    ({ code }) => `The server ended (exit code ${code}): see ${log}.`,
  );
  throw new Failure(await Promise.race([ended, lost]));
}

await launch(start, { signalCode: 0 });
