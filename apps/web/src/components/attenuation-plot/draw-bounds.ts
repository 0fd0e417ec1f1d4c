import { clipped } from '../plot/clipped';
import type { PlotColours } from '../plot/plot-colours';
import type { PlotInstance } from '../plot/plot-instance';
import type { AttenuationColumns } from './attenuation-data';

const chevronEveryPx = 20;
const chevronHalfPx = 4.5;
const shortestWashPx = 26;

interface Spot { x: number; y: number; ceilingY: number | null }

function boundSpots(plot: PlotInstance, { frequencyHz, ownBoundDb, ceilingDb }: AttenuationColumns): (Spot | null)[] {
  return ownBoundDb.map((db, at) => {
    if (db === null) return null;
    const ceiling = ceilingDb[at] ?? null;
    return {
      x: plot.valToPos(frequencyHz[at] ?? NaN, 'x', true), y: plot.valToPos(db, 'y', true),
      ceilingY: ceiling === null ? null : plot.valToPos(ceiling, 'y', true),
    };
  });
}

/** A light wash from each bound up to the ceiling, or a little way up where the bound is the ceiling: the truth is up there. */
export function drawWash(plot: PlotInstance, columns: AttenuationColumns, colours: PlotColours): void {
  const spots = boundSpots(plot, columns);
  clipped(plot, (ctx, ratio) => {
    const least = shortestWashPx * ratio;
    for (let at = 0; at < spots.length; at += 1) {
      const spot = spots[at];
      if (!spot) continue;
      const next = spots[at + 1];
      const width = next ? Math.max(next.x - spot.x, ratio) : 5 * ratio;
      const height = Math.max(spot.ceilingY === null ? 0 : spot.y - spot.ceilingY, least);
      const fade = ctx.createLinearGradient(0, spot.y, 0, spot.y - height);
      fade.addColorStop(0, colours.slate);
      fade.addColorStop(1, 'transparent');
      ctx.fillStyle = fade;
      ctx.globalAlpha = 0.2;
      ctx.fillRect(next ? spot.x : spot.x - width / 2, spot.y - height, width, height);
    }
  });
}

/** Small open chevrons on the bounds, pointing to where the truth is. */
export function drawChevrons(plot: PlotInstance, columns: AttenuationColumns, colours: PlotColours): void {
  clipped(plot, (ctx, ratio) => {
    const half = chevronHalfPx * ratio;
    let lastX = -Infinity;
    ctx.strokeStyle = colours.ink;
    ctx.lineWidth = 1.4 * ratio;
    ctx.beginPath();
    for (const spot of boundSpots(plot, columns)) {
      if (!spot || spot.x - lastX < chevronEveryPx * ratio) continue;
      lastX = spot.x;
      ctx.moveTo(spot.x - half, spot.y - 2 * ratio);
      ctx.lineTo(spot.x, spot.y - 2 * ratio - half);
      ctx.lineTo(spot.x + half, spot.y - 2 * ratio);
    }
    ctx.stroke();
  });
}

/** The expanded uncertainty: a pale band around what was measured. */
export function drawUncertainty(plot: PlotInstance, { frequencyHz, lowerDb, upperDb }: AttenuationColumns, colours: PlotColours): void {
  clipped(plot, (ctx, ratio) => {
    ctx.fillStyle = colours.copper;
    ctx.globalAlpha = 0.16;
    for (let at = 0; at < frequencyHz.length; at += 1) {
      const lower = lowerDb[at] ?? null;
      const upper = upperDb[at] ?? null;
      if (lower === null || upper === null) continue;
      const x = plot.valToPos(frequencyHz[at] ?? NaN, 'x', true);
      const nextHz = (lowerDb[at + 1] ?? null) === null ? undefined : frequencyHz[at + 1];
      const width = nextHz === undefined ? 3 * ratio : plot.valToPos(nextHz, 'x', true) - x;
      const top = plot.valToPos(upper, 'y', true);
      ctx.fillRect(x, top, Math.max(width, ratio), plot.valToPos(lower, 'y', true) - top);
    }
  });
}
