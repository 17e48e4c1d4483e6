/** A reason not to start that the person at the keyboard can mend; its message says how, in plain sentences. */
export class StartProblem extends Error {
  override readonly name = 'StartProblem';
  readonly exitCode: number;

  constructor(message: string, exitCode = 1) {
    super(message);
    this.exitCode = exitCode;
  }
}
