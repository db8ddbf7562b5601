import { spawnSync } from 'node:child_process';
import {
  closeSync,
  existsSync,
  mkdtempSync,
  openSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readRaw, type RawPlot } from './read-raw.ts';

/** One deck for ngspice: elements and models, and the analyses as its commands without the dot. */
export interface NgspiceJob {
  lines: readonly string[];
  /** `op`, `tran 1u 1m`, `ac dec 10 1 1k` */ commands: readonly string[];
  /** `.options` beside or in place of the usual ones */ options?: Readonly<Record<string, string>>;
}

/** Signals by the names we print: `v(node)`, `i(source)`, and `time` or `frequency`. */
export type Signals = Record<string, number[]>;
export type ComplexSignals = Record<string, [number, number][]>;

export interface NgspiceAnswer {
  op?: Record<string, number>;
  tran?: Signals;
  ac?: { frequency: number[]; signals: ComplexSignals };
}

/** Degrees Celsius: 300 K, the temperature of every junction of the engine. */
const TEMPERATURE = '26.85';

const PROGRAM = '/usr/bin/ngspice';
const OPTIONS = {
  temp: TEMPERATURE,
  tnom: TEMPERATURE,
  gmin: '1e-12',
  reltol: '1e-7',
  abstol: '1e-17',
  vntol: '1e-11',
  chgtol: '1e-16',
  itl1: '500',
  itl4: '200',
};

/**
 * Runs decks in one ngspice process, each analysis of each in turn.
 * Throws when ngspice is not installed, runs too long or does not answer an analysis.
 */
export function runNgspice(jobs: readonly NgspiceJob[], seconds = 300): NgspiceAnswer[] {
  const folder = mkdtempSync(join(tmpdir(), 'coldbench-ngspice-'));
  try {
    const output = runProgram(folder, jobs, seconds);
    return jobs.map((job, index) => readAnswer(folder, index, job, output));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

function runProgram(folder: string, jobs: readonly NgspiceJob[], seconds: number): string {
  const control = ['* control', '.control', 'set filetype=binary', 'set num_threads=1'];
  jobs.forEach((job, index) => {
    writeFileSync(join(folder, `${index}.cir`), deckText(job));
    control.push(`echo @@${index}`, `source ${index}.cir`);
    job.commands.forEach((command, at) => control.push(command, `write ${index}-${at}.raw`));
    control.push('destroy all', 'remcirc');
  });
  control.push('quit', '.endc', '.end', '');
  writeFileSync(join(folder, 'control.cir'), control.join('\n'));
  if (!existsSync(PROGRAM)) {
    throw new Error(
      `${PROGRAM} is not installed: these tests compare the engine with it (apt-get install ngspice)`,
    );
  }
  const log = openSync(join(folder, 'log'), 'w');
  const run = spawnSync('stdbuf', ['-oL', PROGRAM, '-b', 'control.cir'], {
    cwd: folder,
    timeout: seconds * 1000,
    // one file, by lines, for both: what it says of a deck stays between its marks
    stdio: ['ignore', log, log],
  });
  closeSync(log);
  const output = readFileSync(join(folder, 'log'), 'utf8');
  if (run.error !== undefined) {
    throw new Error(`ngspice: ${run.error.message}, after:\n${output.slice(-2000)}`);
  }
  return output;
}

function deckText({ lines, options }: NgspiceJob): string {
  const all = Object.entries({ ...OPTIONS, ...options }).map(([name, value]) => `${name}=${value}`);
  return ['deck', ...lines, `.options ${all.join(' ')}`, '.end', ''].join('\n');
}

function readAnswer(folder: string, index: number, job: NgspiceJob, output: string): NgspiceAnswer {
  const said = output.split(`@@${index}\n`)[1]?.split('@@')[0] ?? output;
  const fail = (what: string): never => {
    throw new Error(`ngspice, deck ${index}: ${what}\n${job.lines.join('\n')}\n\n${said}`);
  };
  // it then answers with the end of a made-up transient, which need not be a solution
  if (said.includes('Transient op started')) fail('found no operating point');
  if (said.includes('due to error')) fail('did not read the deck');
  const answer: NgspiceAnswer = {};
  job.commands.forEach((command, at) => {
    const file = join(folder, `${index}-${at}.raw`);
    if (!existsSync(file)) fail(`no answer to "${command}"`);
    addPlot(answer, command, readRaw(readFileSync(file)));
  });
  return answer;
}

function addPlot(answer: NgspiceAnswer, command: string, plot: RawPlot): void {
  const kept = plot.names.flatMap((name, column) =>
    /^(v\([^#]*\)|i\(v[^#]*\))$/.test(name) ? [[name, column] as const] : [],
  );
  const real = (column: number): number[] => plot.rows.map((row) => row[column]![0]);
  if (command === 'op') {
    answer.op = Object.fromEntries(kept.map(([name, column]) => [name, real(column)[0]!]));
  } else if (command.startsWith('tran')) {
    const signals = kept.map(([name, column]) => [name, real(column)] as const);
    answer.tran = { time: real(0), ...Object.fromEntries(signals) };
  } else if (command.startsWith('ac')) {
    const signals = kept.map(([name, column]) => [name, plot.rows.map((row) => row[column]!)]);
    answer.ac = { frequency: real(0), signals: Object.fromEntries(signals) };
  } else throw new Error(`not an analysis: ${command}`);
}
