import type { AppliedFault } from '../oven/fault.ts';
import type { PartRef } from '../oven/oven.ts';

/** A set of faults that may explain what was read, and what it has opened before the oven came in. */
export interface Candidate {
  readonly faults: readonly AppliedFault[];
  /** fuses it has blown, cut-outs it has opened */ readonly opened: readonly PartRef[];
}

export const noFault: Candidate = { faults: [], opened: [] };

/** `C1 shorted`, `no fault`: one candidate as one line, by the ids. */
export const candidateKey = ({ faults }: Candidate): string =>
  faults.length === 0 ? 'no fault' : faults.map(({ on, fault }) => `${on} ${fault}`).join(' + ');
