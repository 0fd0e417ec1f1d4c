import type { FrequencyWindow } from '../../components/plot/frequency-ticks';

const airRatio = 0.015;
const roomAroundOnePoint = 1.5;

/** The window that shows all points, with a little air at both ends. */
export function wholeWindow(frequencyHz: readonly number[]): FrequencyWindow | null {
  const first = frequencyHz[0];
  const last = frequencyHz.at(-1);
  if (first === undefined || last === undefined) return null;
  if (first === last) return { fromHz: first / roomAroundOnePoint, toHz: last * roomAroundOnePoint };
  const air = (last / first) ** airRatio;
  return { fromHz: first / air, toHz: last * air };
}
