/** A failure that the reader can do something about: what happened, and what to do. */
export class Fault extends Error {
  constructor(what, whatToDo = '') {
    super(what);
    this.name = 'Fault';
    this.whatToDo = whatToDo;
  }
}

/** A command that ended badly; `output` is the end of what it printed. */
export class CommandFailed extends Error {
  constructor(command, code, output, log) {
    super(`${command} ended with ${code}`);
    this.name = 'CommandFailed';
    this.output = output;
    this.log = log;
  }
}
