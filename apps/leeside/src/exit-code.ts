/** What the command leaves behind: scripts at the bench decide by these. */
export const exitCode = { done: 0, failed: 1, needsAnswer: 2, refused: 3, wrongUse: 64, interrupted: 130 } as const;

/** A fault that is the caller's to mend: printed as one line, without a stack. */
export class CommandFault extends Error {
  constructor(message: string, readonly code: number = exitCode.failed) {
    super(message);
  }
}

/** Somebody does not want to wait any longer. */
export class Interrupted extends CommandFault {
  constructor() {
    super('Interrupted.', exitCode.interrupted);
  }
}
