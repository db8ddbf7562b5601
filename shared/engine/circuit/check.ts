import { isPositiveSemidefinite } from '../linear/cholesky.ts';
import type { Circuit, Element, EngineFailure } from './circuit.ts';

type Coupling = Extract<Element, { kind: 'coupling' }>;

/**
 * What is wrong with an element taken by itself: a repeated name, a value that is not finite,
 * a resistance, capacitance or inductance that is not above zero, a coupling to an unknown inductor
 * or beyond 1, or couplings that together would store negative energy.
 */
export function badElement(circuit: Circuit): EngineFailure | undefined {
  const names = new Set<string>();
  const inductances = new Map<string, number>();
  for (const element of circuit.elements) {
    const fault = names.has(element.name) ? 'the name is used twice' : faultOf(element);
    if (fault !== undefined) return failure(element.name, fault);
    names.add(element.name);
    if (element.kind === 'inductor') inductances.set(element.name, element.inductance);
  }
  return badCoupling(circuit, inductances);
}

const failure = (element: string, fault: string): EngineFailure => ({
  code: 'bad-element',
  element,
  message: `${element}: ${fault}`,
});

function faultOf(element: Element): string | undefined {
  if (element.name === '') return 'the element has no name';
  if (element.kind !== 'coupling' && element.nodes.some((node) => node === '')) {
    return 'a node has no name';
  }
  switch (element.kind) {
    case 'resistor':
      return aboveZero('resistance', element.resistance);
    case 'capacitor':
      return (
        aboveZero('capacitance', element.capacitance) ??
        finite('initial voltage', element.initialVoltage)
      );
    case 'inductor':
      return (
        aboveZero('inductance', element.inductance) ??
        notBelowZero('series resistance', element.seriesResistance) ??
        finite('initial current', element.initialCurrent)
      );
    case 'coupling':
      return Math.abs(element.coefficient) <= 1
        ? undefined
        : 'the coefficient is not within -1 to 1';
    case 'voltage-source':
    case 'current-source':
      return sourceFault(element);
    case 'diode':
      return diodeFault(element.model);
    case 'switch':
      return (
        aboveZero('on resistance', element.model.onResistance) ??
        aboveZero('off resistance', element.model.offResistance) ??
        finite('threshold', element.model.threshold) ??
        finite('hysteresis', element.model.hysteresis)
      );
  }
}

function diodeFault(model: Extract<Element, { kind: 'diode' }>['model']): string | undefined {
  return (
    aboveZero('saturation current', model.saturationCurrent) ??
    aboveZero('emission coefficient', model.emission) ??
    notBelowZero('series resistance', model.seriesResistance) ??
    aboveZero('breakdown voltage', model.breakdownVoltage ?? 1) ??
    aboveZero('breakdown current', model.breakdownCurrent ?? 1)
  );
}

function sourceFault(
  source: Extract<Element, { kind: 'voltage-source' | 'current-source' }>,
): string | undefined {
  const fault =
    finite('dc value', source.dc) ??
    finite('ac magnitude', source.ac?.magnitude) ??
    finite('ac phase', source.ac?.phaseDegrees);
  if (fault !== undefined) return fault;
  const { wave } = source;
  switch (wave.shape) {
    case 'dc':
      return finite('value', wave.value);
    case 'sine':
      return (
        notBelowZero('frequency', wave.frequency) ??
        finite('offset', wave.offset) ??
        finite('amplitude', wave.amplitude) ??
        finite('delay', wave.delay) ??
        finite('damping', wave.damping) ??
        finite('phase', wave.phaseDegrees)
      );
    case 'pulse':
      return (
        finite('low value', wave.low) ??
        finite('high value', wave.high) ??
        finite('delay', wave.delay) ??
        notBelowZero('rise', wave.rise) ??
        notBelowZero('fall', wave.fall) ??
        notBelowZero('width', wave.width) ??
        notBelowZero('period', wave.period)
      );
  }
}

const aboveZero = (what: string, value: number): string | undefined =>
  value > 0 && Number.isFinite(value) ? undefined : `the ${what} is not above zero and finite`;

const notBelowZero = (what: string, value: number | undefined): string | undefined =>
  value === undefined || (value >= 0 && Number.isFinite(value))
    ? undefined
    : `the ${what} is not zero or more and finite`;

const finite = (what: string, value: number | undefined): string | undefined =>
  value === undefined || Number.isFinite(value) ? undefined : `the ${what} is not finite`;

function badCoupling(
  circuit: Circuit,
  inductances: ReadonlyMap<string, number>,
): EngineFailure | undefined {
  const couplings = circuit.elements.filter((element) => element.kind === 'coupling');
  const pairs = new Set<string>();
  for (const { name, inductors } of couplings) {
    const unknown = inductors.find((inductor) => !inductances.has(inductor));
    if (unknown !== undefined) return failure(name, `there is no inductor ${unknown}`);
    if (inductors[0] === inductors[1]) return failure(name, 'an inductor is coupled to itself');
    const pair = [...inductors].sort().join('\n');
    if (pairs.has(pair)) return failure(name, 'these inductors are coupled already');
    pairs.add(pair);
  }
  if (couplings.length > 1 && !isPositiveSemidefinite(coefficientMatrix(couplings))) {
    return failure(couplings[0]!.name, 'the couplings together would store negative energy');
  }
  return undefined;
}

/** Unit diagonal and k off it: semidefinite exactly when the inductance matrix is. */
function coefficientMatrix(couplings: readonly Coupling[]): number[][] {
  const names = [...new Set(couplings.flatMap((coupling) => coupling.inductors))];
  const matrix: number[][] = names.map((row) => names.map((column) => Number(row === column)));
  for (const { inductors, coefficient } of couplings) {
    const first = names.indexOf(inductors[0]);
    const second = names.indexOf(inductors[1]);
    matrix[first]![second] = coefficient;
    matrix[second]![first] = coefficient;
  }
  return matrix;
}
