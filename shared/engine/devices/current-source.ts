import type { CurrentSource } from '../circuit/netlist.ts';
import { REFERENCE, type System } from '../stamping/system.ts';

/**
 * J (A) flows from the + node (`from`), through the source, to the - node (`to`): it is taken out of
 * `from` and put into `to`. Adds to what other sources inject; clear `injected` first.
 */
export function addCurrentSource(system: System, source: CurrentSource, amperes: number): void {
  const { nodeIndex, nodeCount } = system.netlist;
  const { injected } = system;
  const from = nodeIndex.get(source.nodes[0])!;
  const to = nodeIndex.get(source.nodes[1])!;
  if (from < nodeCount) injected[from]! -= REFERENCE * amperes;
  if (to < nodeCount) injected[to]! += REFERENCE * amperes;
}
