import { statfsSync } from 'node:fs';
import { CommandFailed, Fault } from './fault.mjs';
import { root } from './paths.mjs';

const indent = (text) =>
  text
    .trim()
    .split('\n')
    .map((line) => `  ${line}`)
    .join('\n');

const lastLines = (text, count = 20) => text.trim().split('\n').slice(-count).join('\n');

/** Free space in megabytes where `path` lies, for the user that runs this. */
export function freeMegabytes(path) {
  const { bavail, bsize } = statfsSync(path);
  return Math.floor((bavail * bsize) / 1e6);
}

/** True when an error, or what a command printed, says that a disk is full. */
export function saysDiskFull(error) {
  return /ENOSPC|No space left on device|EDQUOT|Disk quota exceeded/i.test(
    `${error?.code ?? ''} ${error?.message ?? ''} ${error?.output ?? ''}`,
  );
}

/** The fault to show for a full disk. */
export function diskFull(path = root) {
  return new Fault(
    `The disk is full, or nearly: ${freeMegabytes(path)} MB free at ${path}.`,
    'Make some room (about 1.5 GB for a first start) and run the command again; it goes on where it stopped.',
  );
}

/** Text for the reader of any error that ends a command. */
export function explain(error) {
  if (saysDiskFull(error) && !(error instanceof Fault)) return explain(diskFull());
  if (error instanceof Fault)
    return error.whatToDo ? `${error.message}\n${indent(error.whatToDo)}` : error.message;
  if (error instanceof CommandFailed) {
    const log = error.log ? `\n  All of it: ${error.log}` : '';
    return `${error.message}.\n${indent(lastLines(error.output))}${log}`;
  }
  if (error?.code === 'EACCES' || error?.code === 'EPERM' || error?.code === 'EROFS') {
    return (
      `No permission for ${error.path ?? 'a file'}.\n` +
      '  The clone must belong to the user who runs this. If it was started as another user before, start it as\n' +
      '  that user again, or give the folder back: chown -R USER the clone, as root.'
    );
  }
  return error?.stack ?? String(error);
}

/** The end of a log, indented, for a message. */
export const tail = (text, count = 20) => indent(lastLines(text, count));
