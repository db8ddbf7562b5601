import { readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { runNgspice, type NgspiceJob } from '../../support/ngspice.ts';
import { expectedOf, soundDeck, type Expected } from './expected.ts';
import { referenceJob } from './reference-job.ts';

/** Digits beyond these are the reference's own error. */
const DIGITS: Readonly<Record<keyof Expected, number>> = { op: 15, tran: 8, ac: 13 };

/**
 * npx tsx --tsconfig tests/tsconfig.json tests/engine/ngspice/make-expected.ts [NAME…]
 *
 * Makes expected.json and origin.md of the golden decks named, or of all, with ngspice.
 */
const folder = join(import.meta.dirname, '../../golden');
const asked = process.argv.slice(2);
const names = readdirSync(folder)
  .filter((name) => statSync(join(folder, name)).isDirectory())
  .filter((name) => asked.length === 0 || asked.includes(name));

for (const name of names) make(name);

function make(name: string): void {
  const text = readFileSync(join(folder, name, 'circuit.cir'), 'utf8');
  const job = referenceJob(text);
  const began = Date.now();
  const [answer] = runNgspice([job], 60);
  const expected = expectedOf(soundDeck(text), answer!);
  writeFileSync(join(folder, name, 'expected.json'), toJson(expected));
  writeFileSync(join(folder, name, 'origin.md'), originOf(name, text, job));
  process.stdout.write(`${name} ${Date.now() - began} ms\n`);
}

function roundTo(digits: number) {
  return (_key: string, value: unknown): unknown =>
    typeof value === 'number' ? Number(value.toPrecision(digits)) : value;
}

function toJson(expected: Expected): string {
  const parts = (Object.keys(expected) as (keyof Expected)[]).map((part) => {
    const signals = Object.entries(expected[part]!).map(
      ([name, values]) =>
        `    ${JSON.stringify(name)}: ${JSON.stringify(values, roundTo(DIGITS[part]))}`,
    );
    return `  ${JSON.stringify(part)}: {\n${signals.join(',\n')}\n  }`;
  });
  return `{\n${parts.join(',\n')}\n}\n`;
}

function originOf(name: string, text: string, { commands, options }: NgspiceJob): string {
  const lines = text.split('\n');
  const about = lines
    .slice(1)
    .filter((line) => line.startsWith('* ') && !line.startsWith('* reference'))
    .map((line) => line.slice(2));
  const told = Object.entries(options ?? {})
    .map(([option, value]) => `${option}=${value}`)
    .join(' ');
  return [
    `# ${lines[0]}`,
    '',
    ...about,
    '',
    '`expected.json` was made by ngspice 39 (Debian `ngspice`), with the options of',
    '`tests/support/ngspice.ts`, every junction at 300 K:',
    '',
    ...commands.map((command) => `    ${command}`),
    ...(told === '' ? [] : [`    .options ${told}`]),
    '',
    'by the command',
    '',
    `    npx tsx --tsconfig tests/tsconfig.json tests/engine/ngspice/make-expected.ts ${name}`,
    '',
    "Transients are read between its points at the times of the deck's own step.",
    '',
  ].join('\n');
}
