/** One tab of this browser writes an attempt. */
export interface WriterLock {
  /** Another tab took it over, or this one gave it up. */ lost: Promise<void>;
  release: () => void;
}

export interface LockOptions {
  /** takes it from the tab that has it */ steal: boolean;
  /** absent in a browser without Web Locks: then the server's epoch alone decides */
  locks: LockManager | undefined;
}

/** ms; a tab that is just closing gives its lock up a moment later */
const secondTry = 400;

/** The lock of an attempt; null when another tab of this browser has it. */
export async function lockAttempt(
  attempt: string,
  options: LockOptions,
): Promise<WriterLock | null> {
  const { locks, steal } = options;
  if (!locks) return { lost: new Promise(() => undefined), release: () => undefined };
  const first = await request(locks, attempt, steal);
  if (first || steal) return first;
  await new Promise((resolve) => setTimeout(resolve, secondTry));
  return request(locks, attempt, false);
}

function request(locks: LockManager, attempt: string, steal: boolean): Promise<WriterLock | null> {
  return new Promise((resolve) => {
    const held = locks.request(
      `coldbench-attempt-${attempt}`,
      steal ? { steal: true } : { ifAvailable: true },
      (lock) => {
        if (!lock) return resolve(null);
        return new Promise<void>((release) =>
          resolve({
            lost: held.then(
              () => undefined,
              () => undefined,
            ),
            release: () => release(),
          }),
        );
      },
    );
  });
}
