import { describe, expect, it, vi } from 'vitest';
import { lockAttempt } from '../../../src/simulation/writer-lock.ts';

/** Web Locks as the standard has them, for one name: `ifAvailable` gets null while it is held, `steal` breaks the holder. */
function fakeLocks(): LockManager {
  let breakHolder: ((why: unknown) => void) | null = null;
  const request = (
    _name: string,
    options: LockOptions,
    callback: (lock: Lock | null) => unknown,
  ): Promise<unknown> => {
    if (breakHolder && !options.steal) return Promise.resolve().then(() => callback(null));
    breakHolder?.(new DOMException('stolen', 'AbortError'));
    return new Promise((resolve, reject) => {
      breakHolder = reject;
      void Promise.resolve()
        .then(() => callback({ name: _name, mode: 'exclusive' }))
        .then((value) => {
          if (breakHolder === reject) breakHolder = null;
          resolve(value);
        });
    });
  };
  return { request, query: () => Promise.resolve({}) } as unknown as LockManager;
}

describe('one writer among the tabs of a browser', () => {
  it('gives the lock to the first and not to the second', async () => {
    const locks = fakeLocks();
    expect(await lockAttempt('a', { steal: false, locks })).not.toBeNull();
    expect(await lockAttempt('a', { steal: false, locks })).toBeNull();
  });

  it('gives it to the second once the first has let go, also a moment later', async () => {
    vi.useFakeTimers();
    const locks = fakeLocks();
    const first = await lockAttempt('a', { steal: false, locks });
    const second = lockAttempt('a', { steal: false, locks });
    await vi.advanceTimersByTimeAsync(10);
    first?.release();
    await vi.advanceTimersByTimeAsync(1000);
    expect(await second).not.toBeNull();
    vi.useRealTimers();
  });

  it('tells the first that it lost it when the second takes over', async () => {
    const locks = fakeLocks();
    const first = await lockAttempt('a', { steal: false, locks });
    const lost = vi.fn();
    void first?.lost.then(lost);
    expect(lost).not.toHaveBeenCalled();
    expect(await lockAttempt('a', { steal: true, locks })).not.toBeNull();
    await Promise.resolve();
    await first?.lost;
    expect(lost).toHaveBeenCalledOnce();
  });

  it('lets everybody write where a browser has no locks: the epoch at the server decides', async () => {
    expect(await lockAttempt('a', { steal: false, locks: undefined })).not.toBeNull();
  });
});
