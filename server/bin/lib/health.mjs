import { setTimeout as pause } from 'node:timers/promises';

/**
 * Asks until the address answers with success.
 * @param {string} address
 * @param {number} within milliseconds
 * @param {Promise<unknown>} ended settles when whoever should answer is gone
 * @returns {Promise<'ready' | 'ended' | 'late'>}
 */
export async function awaitHealth(address, within, ended) {
  let hasEnded = false;
  void ended.then(() => (hasEnded = true));
  for (const end = performance.now() + within; performance.now() < end; await pause(50)) {
    if (hasEnded) return 'ended';
    if (await isHealthy(address)) return 'ready';
  }
  return 'late';
}

/** @param {string} address */
async function isHealthy(address) {
  try {
    const response = await fetch(address, { signal: AbortSignal.timeout(5000) });
    await response.arrayBuffer();
    return response.ok;
  } catch {
    return false;
  }
}
