/** An error meant for the person at the terminal: printed as it stands, without a stack. */
export class PlainError extends Error {
  /** @param {string} message */
  constructor(message) {
    super(message);
    this.name = "PlainError";
  }
}
