import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

const root = join(import.meta.dirname, '../../..');
let folder = '';

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'coldbench-solve-'));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

interface Outcome {
  code: number | null;
  out: string;
  lines: string[];
  seconds: number;
}

function solve(args: readonly string[], input = ''): Outcome {
  const began = performance.now();
  const run = spawnSync('npm', ['run', '--silent', 'solve', '--', ...args], {
    cwd: root,
    input,
    encoding: 'utf8',
    maxBuffer: 1 << 28,
  });
  const lines = run.stderr.split('\n').filter((line) => line !== '');
  return { code: run.status, out: run.stdout, lines, seconds: (performance.now() - began) / 1000 };
}

function file(name: string, content: string | Buffer): string {
  const path = join(folder, name);
  writeFileSync(path, content);
  return path;
}

const SOUND = 'divider\nV1 a 0 DC 3 AC 1\nR1 a b 1k\nR2 b 0 2k\n';

describe('npm run solve', () => {
  it('prints what a deck asks for, and only that', () => {
    const run = solve([file('op.cir', `${SOUND}.op\n.end\n`)]);
    expect(run).toMatchObject({ code: 0, lines: [] });
    expect(JSON.parse(run.out)).toEqual({
      op: { 'v(a)': 3, 'v(b)': expect.closeTo(2, 12), 'i(v1)': expect.closeTo(-1e-3, 12) },
    });
  });

  it('reads standard input', () => {
    const run = solve(['-'], `${SOUND}.ac lin 1 60 60\n.tran 1m 2m\n`);
    expect(run).toMatchObject({ code: 0, lines: [] });
    const two = expect.closeTo(2, 9);
    const milli = expect.closeTo(-1e-3, 12);
    expect(JSON.parse(run.out)).toEqual({
      tran: {
        time: [0, 1e-3, 2e-3],
        'v(a)': [3, 3, 3],
        'v(b)': [two, two, two],
        'i(v1)': [milli, milli, milli],
      },
      ac: {
        frequency: [60],
        'v(a)': [[1, 0]],
        'v(b)': [[expect.closeTo(2 / 3, 9), 0]],
        'i(v1)': [[expect.closeTo(-1e-3 / 3, 12), 0]],
      },
    });
  });

  it('prints a long answer whole', () => {
    const run = solve(['-'], `${SOUND}.tran 1u 50m\n`);
    const answer = JSON.parse(run.out) as { tran: { time: number[] } };
    expect(run.code).toBe(0);
    expect(answer.tran.time).toHaveLength(50_001);
  });

  it.each([
    ['a missing value', 't\nR1 a 0\n.op\n', /^line 2: the resistance of r1 is missing/],
    ['no ground', 't\nR1 a b 1\n.op\n', /^line 2: no ground/],
    ['a winding across a source', `${SOUND}L1 a 0 1\n.op\n`, /^line 5: l1 closes a loop/],
    ['a current with no way back', 't\nR1 a 0 1\nI1 0 b 1\nC1 b 0 1\n.op\n', /^line 3: i1 drives/],
    ['two errors', 't\nR1 a 0\nR2 a 0\n.op\n', /^line 2: .*\(and 1 more\)$/],
  ])('refuses %s in one line', (_what, text, line) => {
    const run = solve(['-'], text);
    expect(run).toMatchObject({ code: 2, out: '' });
    expect(run.lines).toHaveLength(1);
    expect(run.lines[0]).toMatch(line);
  });

  it('refuses what is no deck at all, and as soon as any other', () => {
    const trifle = solve(['-'], 't\nR1 a 0\n.op\n');
    const huge = solve([file('huge.cir', `t\n${'R1 a 0 1k\n'.repeat(1 << 20)}`)]);
    const binary = solve([file('binary.cir', Buffer.alloc(10 << 20, '\x7fELF\x02\x01\x00\n'))]);
    const endless = solve(['/dev/zero']);
    expect(huge.lines).toEqual([expect.stringMatching(/^line \d+: the deck is longer/)]);
    expect(binary.lines).toEqual(['line 1: not a text file']);
    expect(endless.lines).toEqual(['line 1: not a text file']);
    for (const run of [huge, binary, endless]) {
      expect(run).toMatchObject({ code: 2, out: '' });
      expect(run.seconds - trifle.seconds).toBeLessThan(1.5);
    }
  });

  it('says when there is no file, or no one file, to read', () => {
    expect(solve([join(folder, 'absent.cir')])).toMatchObject({
      code: 2,
      lines: [expect.stringMatching(/^line 0: cannot read .*ENOENT/)],
    });
    expect(solve([folder])).toMatchObject({
      code: 2,
      lines: [expect.stringMatching(/^line 0: cannot read .*EISDIR/)],
    });
    expect(solve([])).toMatchObject({ code: 2, lines: [expect.stringMatching(/^usage/)] });
  });

  it('exits 1 when an analysis fails, with node, iteration and residual', () => {
    const run = solve(['-'], 't\nV1 s 0 10\nR1 s a 1k\nS1 a 0 a 0 m\n.model m SW(VT=5)\n.op\n');
    expect(run).toMatchObject({ code: 1, out: '' });
    expect(run.lines).toEqual([
      expect.stringMatching(/^not converged: node a, iteration \d+, residual [\d.e+-]+:/),
    ]);
  });
});
