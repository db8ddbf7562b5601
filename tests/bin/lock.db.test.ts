import { spawn } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, describe, expect, it } from 'vitest';
import { createChildren } from '../../server/bin/lib/children.mjs';
import { takeLock } from '../../server/bin/lib/lock.mjs';
import { identify, recordOf } from '../../server/bin/lib/processes.mjs';

const folder = mkdtempSync(join(tmpdir(), 'coldbench-lock-'));
const file = join(folder, 'launcher.lock');
const about = { command: 'npm start', address: 'http://127.0.0.1:4310' };
const sleeping = ['-e', 'setInterval(() => {}, 1000)'];

/** A lock as a launcher with that record would have left it. */
const leaveLock = (holder: { pid: number; identity: string }, children: unknown[] = []) =>
  writeFileSync(file, JSON.stringify({ ...holder, ...about, children }));

describe('the lock of a data folder', () => {
  afterEach(() => rmSync(file, { force: true }));
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  it('is refused while the launcher that holds it runs', async () => {
    leaveLock(recordOf(process.pid));
    await expect(takeLock(file, about, createChildren())).rejects.toThrow(
      `Coldbench already runs from this folder: npm start, process ${process.pid}, http://127.0.0.1:4310.`,
    );
  });

  it('passes on when its holder is gone, though the number is in use again', async () => {
    leaveLock({ pid: process.pid, identity: 'of an earlier process' });
    const release = await takeLock(file, about, createChildren());
    expect(JSON.parse(readFileSync(file, 'utf8'))).toMatchObject({ pid: process.pid });
    release();
    expect(existsSync(file)).toBe(false);
  });

  it('passes on when it was cut off half way', async () => {
    writeFileSync(file, '{"pid": 12');
    const release = await takeLock(file, about, createChildren());
    release();
  });

  it('has what a killed launcher left running stopped first', async () => {
    const orphan = spawn(process.execPath, sleeping, { detached: true, stdio: 'ignore' });
    const pid = orphan.pid ?? 0;
    const record = { ...recordOf(pid), stopBy: 'SIGTERM', isAlone: false };
    leaveLock({ pid: 1, identity: 'gone' }, [record]);
    const release = await takeLock(file, about, createChildren());
    expect(identify(pid)).toBeNull();
    release();
  });

  it('spares a process that only has the number of what was left', async () => {
    const other = spawn(process.execPath, sleeping, { detached: true, stdio: 'ignore' });
    const pid = other.pid ?? 0;
    const record = { pid, identity: 'of an earlier process', stopBy: 'SIGTERM', isAlone: false };
    leaveLock({ pid: 1, identity: 'gone' }, [record]);
    const release = await takeLock(file, about, createChildren());
    expect(identify(pid)).not.toBeNull();
    other.kill('SIGKILL');
    release();
  });

  it('names what runs at every moment', async () => {
    const children = createChildren();
    const release = await takeLock(file, about, children);
    const child = children.start(process.execPath, sleeping, { output: 'capture' });
    expect(JSON.parse(readFileSync(file, 'utf8')).children).toMatchObject([{ pid: child.pid }]);
    await children.stop();
    expect(JSON.parse(readFileSync(file, 'utf8')).children).toEqual([]);
    release();
  });
});
