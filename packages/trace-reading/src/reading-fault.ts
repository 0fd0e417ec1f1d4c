import type { Problem, Question } from './transcription.js';

/** Stops the reading of a file: it cannot be read, and why. Caught by the story, never seen outside the package. */
export class Refusal extends Error {
  constructor(readonly problem: Problem) {
    super(problem.message);
  }
}

/** Stops the reading of a file: a person must answer first. */
export class OpenQuestion extends Error {
  constructor(readonly question: Question) {
    super(question.message);
  }
}

/** A refusal with its place. */
export function refuse(code: string, message: string, line?: number, column?: number): Refusal {
  return new Refusal({ code, message, ...(line === undefined ? {} : { line }), ...(column === undefined ? {} : { column }) });
}
