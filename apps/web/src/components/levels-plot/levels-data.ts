import type { CurveLevelsBody } from '@leeside/contracts/curves';
import type { PlotColumns } from '../plot/plot-instance';

interface Gap { fromHz: number; toHz: number }
export interface LevelColumns { frequencyHz: number[]; reference: (number | null)[]; enclosed: (number | null)[]; floor: (number | null)[] }

/** Shapes the levels beneath a curve; a point that holds nothing lies in every gap. */
export function levelColumns(levels: CurveLevelsBody, gaps: readonly Gap[]): LevelColumns {
  const columns: LevelColumns = { frequencyHz: [], reference: [], enclosed: [], floor: [] };
  levels.frequencyHz.forEach((hz, at) => {
    const beforeHz = levels.frequencyHz[at - 1];
    if (beforeHz !== undefined && gaps.some((gap) => gap.toHz > beforeHz && gap.fromHz < hz)) {
      columns.frequencyHz.push(Math.sqrt(beforeHz * hz));
      for (const column of [columns.reference, columns.enclosed, columns.floor]) column.push(null);
    }
    columns.frequencyHz.push(hz);
    columns.reference.push(levels.referenceLevel[at] ?? null);
    columns.enclosed.push(levels.enclosedLevel[at] ?? null);
    columns.floor.push(levels.floorLevel[at] ?? null);
  });
  return columns;
}

export const levelSeriesData = ({ frequencyHz, floor, enclosed, reference }: LevelColumns): PlotColumns => [frequencyHz, floor, enclosed, reference];
