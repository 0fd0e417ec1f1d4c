import type { FileBody } from '@leeside/contracts/files';

/** Why a file was refused: the code, the place in the file, and what was found there. */
export function FileProblem({ problem }: { problem: NonNullable<FileBody['problem']> }) {
  const { code, message, line, column } = problem;
  const place = [line === undefined ? '' : `line ${String(line)}`, column === undefined ? '' : `column ${String(column)}`].filter(Boolean).join(', ');
  return (
    <p className="border-s-4 border-plum bg-sheet px-4 py-2 text-sm">
      <code className="font-semibold text-plum">{code}</code>{place && <span className="figure text-faded"> {place}</span>}
      <span className="block">{message}</span>
    </p>
  );
}
