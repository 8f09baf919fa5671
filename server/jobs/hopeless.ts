/** Thrown by a handler where no repeat can succeed: the job is parked at once. Its message is what the administrator reads. */
export class Hopeless extends Error {
  constructor(message: string, options?: ErrorOptions) {
    super(message, options);
    this.name = 'Hopeless';
  }
}
