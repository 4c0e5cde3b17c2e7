/** Prints one plain line about what is being done. @param {string} line */
export function say(line) {
  process.stdout.write(`${line}\n`);
}

/** A failure that the reader can act on: its message is printed without a stack trace. */
export class Refusal extends Error {
  /** @param {string} message what to do @param {number} [exitCode] 3: something must be installed or allowed first */
  constructor(message, exitCode = 3) {
    super(message);
    this.exitCode = exitCode;
  }
}
