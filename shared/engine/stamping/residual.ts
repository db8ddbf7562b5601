import { REFERENCE, type System } from './system.ts';

/**
 * residual = right-hand side - A x, taken element by element: voltage differences are formed before
 * they are multiplied, so a small voltage across a branch that stands at 3 kV keeps its digits.
 */
export function computeResidual(system: System): void {
  const { netlist, residual, x, alpha, beta, rho, injected, mu } = system;
  const { nodeCount, from, to, coupled } = netlist;
  const ground = system.groundConductance * REFERENCE;
  for (let node = 0; node < nodeCount; node += 1) {
    residual[node] = injected[node]! - ground * x[node]!;
  }
  for (let k = 0; k < from.length; k += 1) {
    const a = from[k]!;
    const b = to[k]!;
    const current = x[nodeCount + k]!;
    residual[nodeCount + k] = rho[k]! - alpha[k]! * (x[a]! - x[b]!) + beta[k]! * current;
    residual[a]! -= current;
    residual[b]! += current;
  }
  for (let c = 0; c < coupled.length; c += 1) {
    const { first, second } = coupled[c]!;
    residual[nodeCount + first]! += mu[2 * c]! * x[nodeCount + second]!;
    residual[nodeCount + second]! += mu[2 * c + 1]! * x[nodeCount + first]!;
  }
  residual[netlist.size] = 0;
}
