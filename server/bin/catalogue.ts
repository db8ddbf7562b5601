import { readdir, readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { parseOven } from '../../shared/oven/parse-oven.ts';
import { catalogueTable } from '../../shared/reasoning/catalogue-table.ts';
import { findProjectRoot } from '../project-root.ts';

// npm run catalogue: writes what every fault of every oven shows into the marked part of DEVELOPERS.md.
const root = findProjectRoot();
const folder = join(root, 'scenarios', 'ovens');
const page = join(root, 'DEVELOPERS.md');
const begin =
  '<!-- catalogue: written by `npm run catalogue` -->\n<!-- prettier-ignore-start -->\n';
const end = '<!-- prettier-ignore-end -->\n<!-- end of the catalogue -->\n';

const files = (await readdir(folder)).filter((name) => /^[a-z0-9-]+\.json$/.test(name)).sort();
const tables: string[] = [];
for (const name of files) {
  const parsed = parseOven(JSON.parse(await readFile(join(folder, name), 'utf8')));
  if (!parsed.ok) throw new Error(`${name}: ${parsed.problems[0]?.message}`);
  const started = Date.now();
  tables.push(catalogueTable(parsed.oven));
  process.stdout.write(`${parsed.oven.id}: ${((Date.now() - started) / 1000).toFixed(1)} s\n`);
}
const text = await readFile(page, 'utf8');
const [from, to] = [text.indexOf(begin), text.indexOf(end)];
if (from < 0 || to < from) throw new Error('DEVELOPERS.md has no marked part for the catalogue');
const written = text.slice(0, from + begin.length) + `${tables.join('\n')}` + text.slice(to);
await writeFile(page, written);
