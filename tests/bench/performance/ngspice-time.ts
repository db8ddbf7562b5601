import { spawnSync } from 'node:child_process';
import { closeSync, mkdtempSync, openSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Circuit } from '../../../shared/engine/circuit/circuit.ts';
import { writeDeck } from '../../../shared/engine/deck/write-deck.ts';

/** What ngspice says of one run of an analysis, ms. */
export interface NgspiceTime {
  /** its "Total analysis time" */ readonly whole: number;
  /** loading, ordering, factoring and solving its matrix: no output, no set-up */
  readonly matrix: number;
}

/** ms */
const PATIENCE = 120_000;
const MATRIX = ['load', 'synchronize', 'reorder', 'factor', 'solve'];

/**
 * Runs a command (`op`, `tran …`) `times` over in one ngspice process and divides what it counts.
 * Its clock has milliseconds, so short analyses need many.
 */
export function ngspiceTime(circuit: Circuit, command: string, times: number): NgspiceTime {
  const folder = mkdtempSync(join(tmpdir(), 'coldbench-time-'));
  try {
    const text = [
      'deck',
      ...writeDeck(circuit).lines,
      '.options temp=26.85 tnom=26.85',
      '.control',
      'set num_threads=1',
      `repeat ${times}`,
      command,
      'destroy all',
      'end',
      'rusage all',
      'quit',
      '.endc',
      '.end',
      '',
    ];
    writeFileSync(join(folder, 'deck.cir'), text.join('\n'));
    // to a file: its progress alone can be hundreds of megabytes
    const log = openSync(join(folder, 'log'), 'w');
    spawnSync('ngspice', ['-b', 'deck.cir'], {
      cwd: folder,
      stdio: ['ignore', log, log],
      timeout: PATIENCE,
    });
    closeSync(log);
    const said = readFileSync(join(folder, 'log'), 'utf8');
    const seconds = (what: string): number => {
      const found = new RegExp(`^${what} = ([\\d.e+-]+)`, 'm').exec(said);
      if (found === null) throw new Error(`ngspice did not say its ${what}:\n${said.slice(-2000)}`);
      return Number(found[1]);
    };
    const whole = seconds('Total analysis time \\(seconds\\)');
    const matrix = MATRIX.reduce((sum, part) => sum + seconds(`Matrix ${part} time`), 0);
    return { whole: (1000 * whole) / times, matrix: (1000 * matrix) / times };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
