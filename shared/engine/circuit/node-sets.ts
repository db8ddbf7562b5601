/** Nodes that are joined, kept as sets under union (R. E. Tarjan, J. ACM 22 (1975) 215-225). */
export interface NodeSets {
  find(node: string): string;
  /** false when both were in one set already: the new link closes a loop */
  join(first: string, second: string): boolean;
}

export function nodeSets(): NodeSets {
  const parents = new Map<string, string>();
  const find = (node: string): string => {
    let root = node;
    for (let up = parents.get(root); up !== undefined; up = parents.get(root)) root = up;
    for (let at = node; at !== root;) {
      const up = parents.get(at)!;
      parents.set(at, root);
      at = up;
    }
    return root;
  };
  const join = (first: string, second: string): boolean => {
    const a = find(first);
    const b = find(second);
    if (a === b) return false;
    parents.set(a, b);
    return true;
  };
  return { find, join };
}
