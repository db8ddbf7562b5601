import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { OvenLibrary } from '../ovens/oven-library.ts';
import type { AttemptRules } from './attempt-rules.ts';
import type { LockedAttempt, PinnedAttempt } from './attempt.ts';
import type { BenchSetup } from './judge.ts';

export interface Bench extends BenchSetup {
  state: BenchState;
}

interface Kept extends Bench {
  /** how many events are folded into the state */ next: number;
}

/** Attempts whose bench is kept in memory; each takes some ten kilobytes. */
const mostKept = 500;

/**
 * Knows how the bench of an attempt stands after its last stored event: from memory when the last
 * append went through this process, from the newest checkpoint and the events after it otherwise.
 */
export class BenchKeeper {
  readonly #rules: AttemptRules;
  readonly #ovens: OvenLibrary;
  /** in the order of use, the oldest first */
  readonly #kept = new Map<string, Kept>();

  constructor(rules: AttemptRules, ovens: OvenLibrary) {
    this.#rules = rules;
    this.#ovens = ovens;
  }

  /** The fixed side of an attempt; null when its oven could not be read at start. */
  setUp({ content, seed }: Pick<PinnedAttempt, 'content' | 'seed'>): BenchSetup | null {
    const oven = this.#ovens.find(content.oven);
    if (!oven) return null;
    const { definition } = oven;
    return { definition, content, seed, setup: this.#rules.setUp(definition, content, seed) };
  }

  /** The bench as the attempt stands; null when its oven could not be read at start. */
  async standing(locked: LockedAttempt): Promise<Bench | null> {
    const { attempt } = locked;
    const kept = this.#kept.get(attempt.id);
    if (kept?.next === attempt.next) return kept;
    const bench = this.setUp(attempt);
    if (!bench) return null;
    const checkpoint = await locked.newestCheckpoint(this.#rules.engineVersion);
    const events = await locked.eventsFrom(checkpoint ? checkpoint.sequence + 1 : 0);
    return { ...bench, state: this.#rules.fold(bench.setup, events, checkpoint?.state ?? null) };
  }

  /** Call after the events are stored, never before. */
  keep(id: string, next: number, bench: Bench): void {
    this.#kept.delete(id);
    this.#kept.set(id, { ...bench, next });
    for (const oldest of this.#kept.keys()) {
      if (this.#kept.size <= mostKept) break;
      this.#kept.delete(oldest);
    }
  }
}
