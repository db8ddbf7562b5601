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
 * The line of a program's log that says best why it ended: the last that begins with an error's
 * name, or else the last. Stack traces and what Node prints of an error's fields are indented and
 * do not count; lines of JSON are read for their message.
 * @param {string} text
 * @returns {string} '' when there is no line
 */
export function lastWords(text) {
  const lines = text
    .split('\n')
    .filter((line) => !/^(\s.*|[{}^]*|Node\.js v.*)$/.test(line))
    .map(messageOf);
  const isError = /^(\w+: )?\w*error\b|\b(FATAL|PANIC): /i;
  return (lines.findLast((line) => isError.test(line)) ?? lines.at(-1) ?? '').trim();
}

/** @param {string} file */
export function lastWordsIn(file) {
  return lastWords(readFileSync(file, 'utf8'));
}

/** @param {string} line */
function messageOf(line) {
  if (!line.startsWith('{')) return line;
  try {
    const { msg, err } = JSON.parse(line);
    return [msg, err?.message || err?.code].filter((part) => typeof part === 'string').join(': ');
  } catch {
    return line;
  }
}
