/**
 * One line for the person at the terminal.
 * @param {string} line
 */
export function say(line) {
  process.stdout.write(`${line}\n`);
}

/**
 * Time passed since `start` (milliseconds from `performance.now()`), as '3.4 s'.
 * @param {number} start
 */
export function since(start) {
  return `${((performance.now() - start) / 1000).toFixed(1)} s`;
}
