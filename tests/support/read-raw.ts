/** One plot of a binary raw file: a row for each point, a value for each name. */
export interface RawPlot {
  names: string[];
  /** [real, imaginary] by point and column */ rows: [number, number][][];
}

/** Reads the only plot of a raw file as ngspice writes it with `set filetype=binary`. */
export function readRaw(file: Buffer): RawPlot {
  const marker = Buffer.from('Binary:\n');
  const headerEnd = file.indexOf(marker);
  if (headerEnd < 0) throw new Error('not a binary raw file');
  const header = file.toString('latin1', 0, headerEnd);
  const count = (label: string): number => {
    const match = new RegExp(`^${label}: *(\\d+)`, 'm').exec(header);
    if (match === null) throw new Error(`raw file without ${label}`);
    return Number(match[1]);
  };
  const variables = count('No\\. Variables');
  const points = count('No\\. Points');
  const names = header
    .slice(header.indexOf('Variables:\n') + 'Variables:\n'.length)
    .trimEnd()
    .split('\n')
    .map((line) => line.trim().split(/\s+/)[1]!.toLowerCase());
  if (names.length !== variables) throw new Error('raw file with another count of names');
  const isComplex = /^Flags:.*complex/m.test(header);
  const start = headerEnd + marker.length;
  const width = isComplex ? 16 : 8;
  const rows = Array.from({ length: points }, (_, point) =>
    names.map((_name, column): [number, number] => {
      const at = start + (point * variables + column) * width;
      return [file.readDoubleLE(at), isComplex ? file.readDoubleLE(at + 8) : 0];
    }),
  );
  return { names, rows };
}
