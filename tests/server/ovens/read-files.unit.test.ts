import { cpSync, mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import type { Mistake } from '../../../server/ovens/read-json-folder.ts';
import { readOvens } from '../../../server/ovens/read-ovens.ts';
import { readJobs } from '../../../server/scenarios/read-jobs.ts';
import { hum, readAllOvens, root } from '../../support/server-content.ts';

let folder: string;
let bad: { file: string; mistakes: readonly Mistake[] }[];

const onBadFile = (file: string, mistakes: readonly Mistake[]) => {
  bad.push({ file, mistakes });
};

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'coldbench-files-'));
  bad = [];
});

afterEach(() => rmSync(folder, { recursive: true }));

const write = (name: string, content: unknown) =>
  writeFileSync(
    join(folder, name),
    typeof content === 'string' ? content : JSON.stringify(content),
  );

describe('ovens', () => {
  const id = 'larkfield-lc-28';
  const copy = (name: string) => cpSync(join(root, 'scenarios', 'ovens', name), join(folder, name));

  test('those of the project can all be read', async () => {
    const ovens = await readAllOvens();
    expect(ovens.list().map(({ definition }) => definition.id)).toContain(id);
    expect(ovens.find(id)?.layout.oven).toBe(id);
    expect(ovens.find('no-such-oven')).toBeNull();
  });

  test('a bad one is told with every mistake, the good one beside it is served', async () => {
    copy(`${id}.json`);
    copy(`${id}.layout.json`);
    write('broken.json', '{ "id": ');
    write('half.json', { id: 'half', parts: [{ ref: 'F1', kind: 'fuze', name: 'Fuse' }] });
    const ovens = await readOvens(folder, onBadFile);
    expect(ovens.list().map(({ definition }) => definition.id)).toEqual([id]);
    expect(bad.map(({ file }) => file)).toEqual([
      join(folder, 'broken.json'),
      join(folder, 'half.json'),
    ]);
    const paths = bad[1]?.mistakes.map(({ path }) => path);
    expect(paths).toEqual(
      expect.arrayContaining(['schemaVersion', 'maker', 'parts.0.kind', 'leads', 'layout']),
    );
  });

  test('an oven without a layout, or under another name than its id, is left out', async () => {
    copy(`${id}.json`);
    cpSync(join(folder, `${id}.json`), join(folder, 'renamed.json'));
    cpSync(
      join(root, 'scenarios', 'ovens', `${id}.layout.json`),
      join(folder, 'renamed.layout.json'),
    );
    expect((await readOvens(folder, onBadFile)).list()).toEqual([]);
    expect(bad.flatMap(({ mistakes }) => mistakes.map(({ path }) => path))).toEqual([
      'layout',
      'id',
    ]);
  });

  test('a folder that is not there holds nothing', async () => {
    expect((await readOvens(join(folder, 'none'), onBadFile)).list()).toEqual([]);
    expect(bad).toEqual([]);
  });
});

describe('practice jobs', () => {
  test('those of the project can all be read', async () => {
    const jobs = await readJobs(join(root, 'scenarios', 'jobs'), await readAllOvens(), onBadFile);
    expect(bad).toEqual([]);
    expect(jobs.length).toBeGreaterThanOrEqual(3);
  });

  test('come in the order of their file names; a bad one is told and left out', async () => {
    mkdirSync(join(folder, 'not-a-file'));
    write('b.json', hum);
    write('a.json', { ...hum, title: 'First' });
    write('c.json', { ...hum, level: 9, faults: [{ on: 'D1', fault: 'shorted', why: 'x' }] });
    write('d.json', { ...hum, faults: [{ on: 'D7', fault: 'shorted' }] });
    const jobs = await readJobs(folder, await readAllOvens(), onBadFile);
    expect(jobs.map(({ origin, content }) => [origin, content.title])).toEqual([
      ['a', 'First'],
      ['b', hum.title],
    ]);
    expect(bad.map(({ mistakes }) => mistakes.map(({ path }) => path))).toEqual([
      ['level', 'faults.0'],
      ['faults.0.on'],
    ]);
  });
});
