import type { Today } from '@leeside/contracts/today';

/** How many things wait; the sessions last held are no task. */
export const waitingCount = (today: Today): number =>
  today.filesNeedingAnswer.length + today.filesRefused.length + today.guessedTraces.length + today.curvesInDoubt.length + today.samplesOnTheBench.length;
