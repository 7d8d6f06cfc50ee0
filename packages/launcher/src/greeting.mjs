import { existsSync, readFileSync } from 'node:fs';
import { inRoot } from './paths.mjs';

/** The demo accounts as lines of a table; nothing when there are none. */
export function accountLines(accounts) {
  const width = (key) => Math.max(...accounts.map((account) => account[key].length));
  return accounts.map(
    ({ email, password, who }) =>
      `    ${email.padEnd(width('email'))}  ${password.padEnd(width('password'))}  ${who}`,
  );
}

/** What a reader needs to know once everything runs. */
export function greeting({ address, inbox, demo, stripe }) {
  const file = inRoot('db/seeds/demo-accounts.json');
  const accounts = demo && existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : [];
  return [
    '',
    `  Linkfell       ${address}`,
    inbox && `  Mail inbox     ${inbox}`,
    stripe && '  Test card      4242 4242 4242 4242, any date to come, any three digits',
    '  Logs           .local/logs',
    ...(accounts.length > 0 ? ['  Demo accounts  e-mail, password, who', ...accountLines(accounts)] : []),
    '',
    '  Stop with Ctrl-C.',
    '',
  ]
    .filter((line) => typeof line === 'string')
    .join('\n');
}
