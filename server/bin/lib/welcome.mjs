import { readFileSync } from 'node:fs';
import { inProject } from './project.mjs';

/**
 * @typedef {object} DemoAccounts
 * @property {string} organisation
 * @property {string} password
 * @property {{ email: string, name: string, role: string }[]} accounts
 */

/**
 * What is said when Coldbench can be used.
 * @param {object} about
 * @param {string} about.address
 * @param {string} about.time
 * @param {DemoAccounts | null} about.demo null when no demonstration organisation is made
 * @param {boolean} about.isOwnDatabase it may have held data before, and then got no accounts
 * @returns {string[]} lines
 */
export function welcome({ address, time, demo, isOwnDatabase }) {
  const lines = ['', `Coldbench is ready (${time}): ${address}`, ''];
  if (demo !== null) {
    const since = isOwnDatabase ? ', if the database was empty at first' : '';
    lines.push(`Demo accounts of ${demo.organisation}, password ${demo.password}${since}:`);
    lines.push(...demo.accounts.map(({ role, name, email }) => row(role, name, email)), '');
  }
  lines.push('Stop with Ctrl-C.');
  return lines;
}

/**
 * @param {string} role
 * @param {string} name
 * @param {string} email
 */
function row(role, name, email) {
  return `  ${role.padEnd(14)} ${name.padEnd(12)} ${email}`;
}

/** @returns {DemoAccounts} */
export function readDemoAccounts() {
  return JSON.parse(readFileSync(inProject('server', 'demo-accounts.json'), 'utf8'));
}
