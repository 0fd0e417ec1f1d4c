import { answerQuestions, getFile, type FileBody } from '@leeside/contracts/files';
import { getSession } from '@leeside/contracts/sessions';
import { getToday } from '@leeside/contracts/today';
import { useState } from 'react';
import { useApiChange } from '../api-client/use-api-change';
import { ErrorState } from './ErrorState';

type Question = NonNullable<FileBody['questions']>[number];

interface OneQuestionProps { question: Question; busy: boolean; mayAnswer: boolean; onChoose: (choiceId: string) => void }

function OneQuestion({ question, busy, mayAnswer, onChoose }: OneQuestionProps) {
  return (
    <fieldset className="border-s-4 border-ochre bg-sheet px-4 py-3" disabled={busy || !mayAnswer}>
      <legend className="float-start mb-2 w-full font-semibold">{question.message}</legend>
      {question.lines.length > 0 && <p className="clear-both mb-2 text-xs text-faded">{question.lines.length === 1 ? 'Line' : 'Lines'} {question.lines.join(', ')}</p>}
      <div className="clear-both flex flex-wrap gap-3">
        {question.choices.map((choice) => (
          <button key={choice.id} type="button" onClick={() => onChoose(choice.id)} className="min-w-52 max-w-full flex-1 border border-edge bg-paper p-3 text-start hover:border-copper disabled:opacity-60">
            <span className="font-semibold text-copper underline underline-offset-4">{choice.label}</span>
            {choice.sample && <pre className="mt-2 overflow-x-auto font-mono text-xs text-faded">{choice.sample}</pre>}
          </button>
        ))}
      </div>
      {!mayAnswer && <p className="mt-2 text-sm text-faded">An engineer has to answer this.</p>}
    </fieldset>
  );
}

/** What a file left open: each question is answered by one click on what the rows would then say. */
export function FileQuestions({ file, mayAnswer }: { file: FileBody; mayAnswer: boolean }) {
  const [remember, setRemember] = useState(false);
  const answer = useApiChange(answerQuestions, [getFile, getSession, getToday]);
  const questions = file.questions ?? [];
  return (
    <div className="space-y-3">
      {questions.map((question) => (
        <OneQuestion
          key={question.id} question={question} busy={answer.isPending} mayAnswer={mayAnswer}
          onChoose={(choiceId) => answer.mutate({ params: { id: file.id }, body: { answers: [{ questionId: question.id, choiceId }], remember } })}
        />
      ))}
      {mayAnswer && (
        <label className="flex min-h-6 items-center gap-2 text-sm">
          <input type="checkbox" className="size-5 accent-copper" checked={remember} onChange={(event) => setRemember(event.target.checked)} />
          Read later files of this layout the same way
        </label>
      )}
      {answer.isError && <ErrorState error={answer.error} what="The answer was not taken" kept="The file is as it was." />}
    </div>
  );
}
