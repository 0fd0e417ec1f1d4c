import { clipped } from '../plot/clipped';
import type { PlotColours } from '../plot/plot-colours';
import type { PlotInstance } from '../plot/plot-instance';
import type { AttenuationColumns } from './attenuation-data';
import { runsOf } from './runs';

const whiskerHalfPx = 4;

/** The expanded uncertainty: a pale band around what was measured; a bar at a reading that stands alone. */
export function drawUncertainty(plot: PlotInstance, { frequencyHz, lowerDb, upperDb }: AttenuationColumns, colours: PlotColours): void {
  const at = (column: readonly (number | null)[], index: number): [number, number] =>
    [plot.valToPos(frequencyHz[index] ?? NaN, 'x', true), plot.valToPos(column[index] ?? NaN, 'y', true)];
  clipped(plot, (ctx, ratio) => {
    ctx.fillStyle = colours.copper;
    ctx.globalAlpha = 0.18;
    for (const { first, last } of runsOf(lowerDb)) {
      const half = first === last ? whiskerHalfPx * ratio : 0;
      ctx.beginPath();
      for (let index = first; index <= last; index += 1) {
        const [x, y] = at(upperDb, index);
        ctx.lineTo(x - half, y);
        ctx.lineTo(x + half, y);
      }
      for (let index = last; index >= first; index -= 1) {
        const [x, y] = at(lowerDb, index);
        ctx.lineTo(x + half, y);
        ctx.lineTo(x - half, y);
      }
      ctx.fill();
    }
  });
}
