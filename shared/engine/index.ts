export * from './circuit/circuit.ts';
export { compile, type CompiledCircuit } from './analyses/compile.ts';
export { kclResidual } from './analyses/kcl-residual.ts';
export type { EngineOptions } from './analyses/machine.ts';
export { advance, type Advanced, type AdvanceOptions } from './analyses/advance.ts';
export { operatingPoint } from './analyses/operating-point.ts';
export { phasor, type Complex, type Phasors } from './analyses/phasor.ts';
export {
  reduce,
  type MeterPort,
  type PortReading,
  type PortSolver,
} from './analyses/port-reduction.ts';
export { transient, type Transient, type TransientOptions } from './analyses/transient.ts';
export type { Gathered, Observe, Summary } from './analyses/summarise.ts';
export { formatQuantity } from './quantities/format-quantity.ts';
export * from './quantities/physical-constants.ts';
