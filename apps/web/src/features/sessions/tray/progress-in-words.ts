import type { SessionProgress } from '@leeside/contracts/sessions';

const counted = (count: number, one: string, many: string): string => `${String(count)} ${count === 1 ? one : many}`;

/** How far a session is and what is left, in one line; nothing where nothing has begun. */
export function progressInWords(progress: SessionProgress, sending: number): string {
  const { waiting, reading, read, needsAnswer, refused, curvesPending, curvesReady } = progress;
  const parts = [
    sending > 0 && `${counted(sending, 'file', 'files')} on the way`,
    waiting + reading > 0 && `${counted(waiting + reading, 'file', 'files')} to be read`,
    read > 0 && `${String(read)} read`,
    needsAnswer > 0 && `${counted(needsAnswer, 'needs', 'need')} an answer`,
    refused > 0 && `${String(refused)} refused`,
    curvesPending > 0 && `${counted(curvesPending, 'curve', 'curves')} being computed`,
    curvesReady > 0 && `${counted(curvesReady, 'curve', 'curves')} ready`,
  ].filter((part): part is string => part !== false);
  return parts.length === 0 ? '' : `${parts.join(', ')}.`;
}

/** Nothing is under way: no file to be read and no curve to be computed. */
export const isSettled = ({ waiting, reading, curvesPending }: SessionProgress): boolean => waiting + reading + curvesPending === 0;
