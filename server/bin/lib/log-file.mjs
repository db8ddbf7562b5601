import { existsSync, openSync, readFileSync, renameSync } from 'node:fs';

/**
 * Opens a log anew and keeps the one before it, so that neither grows for ever.
 * @param {string} file
 * @returns {number} file descriptor, to be closed by the caller
 */
export function openLog(file) {
  if (existsSync(file)) renameSync(file, `${file}.before`);
  return openSync(file, 'a', 0o640);
}

/**
 * The line of a program's log that says best why it ended: the last error, or else the last line.
 * Lines of JSON are read for their message.
 * @param {string} text
 * @returns {string} '' when there is no line
 */
export function lastWords(text) {
  const lines = text
    .split('\n')
    .filter((line) => !/^\s*(at .*|[{}^]*|Node\.js v.*)$/.test(line))
    .map(messageOf);
  const words =
    lines.findLast((line) => /error|fail|cannot|refused|must/i.test(line)) ?? lines.at(-1);
  return (words ?? '').trim();
}

/**
 * @param {string} file
 */
export function lastWordsIn(file) {
  return lastWords(readFileSync(file, 'utf8'));
}

/** @param {string} line */
function messageOf(line) {
  if (!line.startsWith('{')) return line;
  try {
    const { msg, err } = JSON.parse(line);
    return [msg, err?.message].filter((part) => typeof part === 'string').join(': ');
  } catch {
    return line;
  }
}
