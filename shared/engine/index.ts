export * from './circuit/circuit.ts';
export { compile, type CompiledCircuit } from './analyses/compile.ts';
export { kclResidual } from './analyses/kcl-residual.ts';
export type { EngineOptions } from './analyses/machine.ts';
export { advance, type Advanced, type AdvanceOptions } from './analyses/advance.ts';
export { operatingPoint } from './analyses/operating-point.ts';
export * from './quantities/physical-constants.ts';
