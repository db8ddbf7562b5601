/**
 * Something the person who started the program can put right. It is shown as one line without a
 * stack; every other error is a bug and is shown whole.
 */
export class Failure extends Error {}

/**
 * What the system said of a failed call, in one line.
 * @param {unknown} error
 * @returns {string}
 */
export function reasonOf(error) {
  return error instanceof Error ? (error.message.split('\n')[0] ?? '') : String(error);
}

/**
 * The system's code of a failed call ('EACCES', 'ENOENT'), or '' if it has none.
 * @param {unknown} error
 * @returns {string}
 */
export function codeOf(error) {
  return error instanceof Error && 'code' in error ? String(error.code) : '';
}
