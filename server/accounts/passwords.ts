import { hash, verify, type Options } from '@node-rs/argon2';

// OWASP Password Storage Cheat Sheet: argon2id with 46 MiB, one pass, one lane.
const argon2id = 2;
const options: Options = {
  algorithm: argon2id,
  memoryCost: 46 * 1024,
  timeCost: 1,
  parallelism: 1,
};

/** How many hashes may be computed at once: each takes 46 MiB and a core. */
const atOnce = 2;

/** Hashes and checks passwords, a few at a time in the order they were asked for. */
export class Passwords {
  #running = 0;
  readonly #waiting: (() => void)[] = [];
  #dummy: Promise<string> | null = null;

  hash(password: string): Promise<string> {
    return this.#inTurn(() => hash(password.normalize('NFC'), options));
  }

  /**
   * Whether the password fits. With no hash, the person being unknown, a real one is checked all
   * the same, so that the time taken does not tell who has an account.
   */
  async fits(password: string, known: string | null): Promise<boolean> {
    this.#dummy ??= this.hash('nobody has this password');
    const against = known ?? (await this.#dummy);
    const fits = await this.#inTurn(() => verify(against, password.normalize('NFC')));
    return fits && known !== null;
  }

  async #inTurn<T>(work: () => Promise<T>): Promise<T> {
    if (this.#running >= atOnce) await new Promise<void>((go) => this.#waiting.push(go));
    else this.#running += 1;
    try {
      return await work();
    } finally {
      // The place goes straight to whoever waits, so nobody can slip in between.
      const next = this.#waiting.shift();
      if (next) next();
      else this.#running -= 1;
    }
  }
}
