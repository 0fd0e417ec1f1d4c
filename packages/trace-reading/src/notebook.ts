import { OpenQuestion } from './reading-fault.js';
import type { SweepSettings } from './sweep.js';
import type { Doubt, Question, Transcription } from './transcription.js';

/** What is written down while a file is read: decisions, doubts, and the answers a person gave. */
export interface Notebook {
  readonly transcription: Transcription;
  readonly doubts: Doubt[];
  readonly answers: ReadonlyMap<string, string>;
}

/** Opens a notebook. */
export function openNotebook(answers: readonly { questionId: string; choiceId: string }[]): Notebook {
  return {
    doubts: [], answers: new Map(answers.map(({ questionId, choiceId }) => [questionId, choiceId])),
    transcription: {
      encoding: 'utf-8', delimiter: null, decimalMark: null, frequencyUnit: null, levelUnit: null, headerLine: null, firstDataLine: null, rowsKept: 0, rowsSkipped: 0, settings: {}, decidedBy: {},
    },
  };
}

/** Writes down a doubt once. */
export function doubt(notebook: Notebook, found: Doubt): void {
  if (notebook.doubts.some((known) => known.code === found.code && known.message === found.message)) return;
  notebook.doubts.push(found);
}

/** Writes down by what something was decided. */
export function decide(notebook: Notebook, what: string, how: string): void {
  notebook.transcription.decidedBy[what] = how;
}

/** Takes settings into the transcription; the first value of each stays. */
export function takeSettings(notebook: Notebook, settings: SweepSettings): void {
  notebook.transcription.settings = { ...settings, ...notebook.transcription.settings };
}

/** The answer to a question, or the question itself, thrown to stop the reading. */
export function ask<Choice extends string>(notebook: Notebook, question: Omit<Question, 'choices'> & { choices: readonly { id: Choice; label: string; sample: string }[] }): Choice {
  const answer = notebook.answers.get(question.id);
  const choice = question.choices.find(({ id }) => id === answer);
  if (choice === undefined) throw new OpenQuestion(question);
  decide(notebook, question.id, `a person's answer: ${choice.label}`);
  return choice.id;
}
