/** A reason to stop that the person at the keyboard can do something about. Shown as one line, exit 1. */
export class Refusal extends Error {}

/** Somebody pressed Ctrl-C, or the machine asked us to stop. */
export class Interruption extends Error {
  constructor(signal) {
    super(`Stopped by ${signal}.`);
    this.signal = signal;
  }
}
