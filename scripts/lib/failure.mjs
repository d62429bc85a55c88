/**
 * Something a person can put right: shown as its message, without a stack.
 * Anything else that is thrown is a fault of the scripts and is shown whole.
 */
export class Failure extends Error {}

/** A signal asked us to stop before the work was done. */
export class Interrupted extends Failure {
  constructor() {
    super('Stopped.');
  }
}
