/** Something a person can put right: what is wrong, and what to do about it. Printed without a stack trace. */
export class StartProblem extends Error {
  /**
   * @param {string} message what is wrong, one or two sentences
   * @param {string} [advice] what to do, as it is typed or done
   */
  constructor(message, advice = '') {
    super(message);
    this.name = 'StartProblem';
    this.advice = advice;
  }
}

/** Prints a failure for a person; only a fault of ours shows its stack. */
export function printProblem(error) {
  console.error('');
  if (error instanceof StartProblem) {
    console.error(error.message);
    if (error.advice) console.error(error.advice);
    return;
  }
  console.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
}
