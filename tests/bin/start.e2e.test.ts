import { spawn } from 'node:child_process';
import type { ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { chmodSync, existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { freePort } from '../../server/bin/lib/ports.mjs';
import { identify } from '../../server/bin/lib/processes.mjs';

const folder = mkdtempSync(join(tmpdir(), 'coldbench-whole-'));
const data = join(folder, 'data');
const lock = join(data, 'launcher.lock');

interface Started {
  launcher: ChildProcess;
  said: () => string;
  ended: Promise<number | null>;
}

function startOn(port: number): Started {
  const launcher = spawn(process.execPath, ['server/bin/start.mjs'], {
    env: { PATH: process.env['PATH'], COLDBENCH_DATA: data, PORT: String(port) },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let text = '';
  for (const stream of [launcher.stdout, launcher.stderr]) {
    stream.on('data', (chunk: Buffer) => (text += chunk.toString()));
  }
  const ended = once(launcher, 'close').then(() => launcher.exitCode);
  return { launcher, said: () => text, ended };
}

/** Waits until it is so; fails with what the launcher said. */
async function until(isSo: () => boolean, { said, launcher }: Started): Promise<void> {
  for (const end = Date.now() + 100_000; Date.now() < end;) {
    if (isSo()) return;
    if (launcher.exitCode !== null) throw new Error(`the launcher ended:\n${said()}`);
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
  throw new Error(`not within 100 s:\n${said()}`);
}

const childrenOf = (file: string): number[] =>
  JSON.parse(readFileSync(file, 'utf8')).children.map(({ pid }: { pid: number }) => pid);
const isGone = (pid: number) => identify(pid) === null;

describe('npm start', () => {
  let port = 0;
  beforeAll(async () => {
    // Root's PostgreSQL runs as another user, who must be able to pass through.
    chmodSync(folder, 0o711);
    port = await freePort();
  });
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  it.each(['SIGINT', 'SIGTERM'] as const)('serves, and stops whole by %s', async (signal) => {
    const started = startOn(port);
    await until(() => started.said().includes('Stop with Ctrl-C.'), started);
    expect(started.said()).toContain(`http://127.0.0.1:${port}`);
    expect(started.said()).toContain('ada@northgate.example');
    expect((await fetch(`http://127.0.0.1:${port}/api/health`)).status).toBe(200);
    const children = childrenOf(lock);
    expect(children).toHaveLength(2);
    started.launcher.kill(signal);
    expect(await started.ended).toBe(0);
    expect(children.filter((pid) => !isGone(pid))).toEqual([]);
    expect(existsSync(lock)).toBe(false);
  });

  it('stops whole when it is interrupted half way', async () => {
    const started = startOn(port);
    await until(() => existsSync(lock) && childrenOf(lock).length > 0, started);
    const children = childrenOf(lock);
    started.launcher.kill('SIGINT');
    expect(await started.ended).toBe(0);
    expect(started.said()).not.toContain('Stop with Ctrl-C.');
    expect(children.filter((pid) => !isGone(pid))).toEqual([]);
    expect(existsSync(lock)).toBe(false);
  });

  it('clears away what a killed launcher left, and starts', async () => {
    const killed = startOn(port);
    await until(() => killed.said().includes('Stop with Ctrl-C.'), killed);
    const left = childrenOf(lock);
    killed.launcher.kill('SIGKILL');
    await killed.ended;
    const started = startOn(port);
    await until(() => started.said().includes('Stop with Ctrl-C.'), started);
    expect(left.filter((pid) => !isGone(pid))).toEqual([]);
    started.launcher.kill('SIGTERM');
    expect(await started.ended).toBe(0);
  });
});
