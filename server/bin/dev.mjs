import { inPackages } from './lib/dependencies.mjs';
import { Failure } from './lib/failure.mjs';
import { awaitHealth } from './lib/health.mjs';
import { launch } from './lib/launch.mjs';
import { loopback } from './lib/ports.mjs';
import { prepare } from './lib/prepare.mjs';
import { projectFolder } from './lib/project.mjs';
import { say, since } from './lib/say.mjs';
import { readDemoAccounts, welcome } from './lib/welcome.mjs';

const readyWithin = 120_000;

/**
 * The API restarts and the client reloads when a source file changes.
 * @param {import('./lib/launch.mjs').Launch} launched
 * @returns {Promise<never>} runs until it is stopped
 */
async function dev(launched) {
  const begin = performance.now();
  const { children } = launched;
  const { settings, serverEnv, lost } = await prepare(launched, 'npm run dev', (ports) => ({
    PORT: ports.port,
    COLDBENCH_API_PORT: ports.apiPort,
  }));
  const tsx = [inPackages('tsx', 'dist', 'cli.mjs'), 'watch', '--clear-screen=false'];
  const api = children.start(
    process.execPath,
    [...tsx, '--tsconfig', 'server/tsconfig.json', 'server/main.ts'],
    {
      cwd: projectFolder,
      env: { ...serverEnv, PORT: String(settings.apiPort), NODE_ENV: 'development' },
    },
  );
  const vite = children.start(
    process.execPath,
    [inPackages('vite', 'bin', 'vite.js'), '--port', String(settings.port), '--clearScreen=false'],
    {
      cwd: projectFolder,
      env: { ...process.env, COLDBENCH_API_PORT: String(settings.apiPort) },
    },
  );
  const address = `http://${loopback}:${settings.port}`;
  const ended = Promise.race([
    api.ended.then(() => 'The API ended.'),
    vite.ended.then(() => 'Vite ended.'),
    lost,
  ]);
  const state = await awaitBoth(settings, ended);
  if (state === 'late') say('Not ready yet: the API is tried again at every change.');
  if (state === 'ready') {
    const demo = settings.isSeeded ? readDemoAccounts() : null;
    const isOwnDatabase = settings.database !== null;
    welcome({ address, time: since(begin), demo, isOwnDatabase }).forEach(say);
  }
  throw new Failure(await ended);
}

/**
 * @param {import('./lib/settings.mjs').Settings} settings
 * @param {Promise<unknown>} ended
 */
async function awaitBoth({ port, apiPort }, ended) {
  const api = `http://${loopback}:${apiPort}/api/health`;
  const state = await awaitHealth(api, readyWithin, ended);
  if (state !== 'ready') return state;
  return awaitHealth(`http://${loopback}:${port}/`, readyWithin, ended);
}

await launch(dev, { signalCode: 0 });
