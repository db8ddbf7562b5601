import type { NgspiceJob } from '../../support/ngspice.ts';

/** Tolerances at which ngspice still gets through decks of junctions with steps this short. */
const TRANSIENT = { reltol: '1e-6', abstol: '1e-13', vntol: '1e-9', trtol: '1' };

/**
 * The ngspice job of a golden deck: its own lines, and its analyses as commands. A comment
 * `* reference: tmax=1u method=gear` in the deck gives the longest step ngspice may take, so that
 * its own error is far below what the comparison allows, and more of its options.
 */
export function referenceJob(text: string): NgspiceJob {
  const lines = text.split('\n').slice(1);
  const reference = /^\* reference: (.*)$/m.exec(text)?.[1] ?? '';
  const told = Object.fromEntries(
    Array.from(reference.matchAll(/(\w+)=(\S+)/g), ([, name, value]) => [name!, value!]),
  );
  const { tmax, ...options } = told;
  const isAnalysis = (line: string): boolean => /^\.(op|tran|ac)\b/i.test(line);
  return {
    lines: lines.filter((line) => !isAnalysis(line) && !/^\.end\b/i.test(line)),
    commands: lines.filter(isAnalysis).map((line) => command(line.slice(1), tmax)),
    options: tmax === undefined ? options : { ...TRANSIENT, ...options },
  };
}

function command(analysis: string, longest: string | undefined): string {
  if (!analysis.startsWith('tran')) return analysis;
  if (longest === undefined) throw new Error(`"${analysis}" needs a reference comment with tmax`);
  const [, step, stop, ...more] = analysis.split(/\s+/);
  const start = more[0] === undefined || more[0] === 'uic' ? '0' : more[0];
  return ['tran', step, stop, start, longest, ...more.filter((word) => word === 'uic')].join(' ');
}
