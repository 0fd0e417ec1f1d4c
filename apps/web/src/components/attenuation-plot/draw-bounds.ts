import { clipped } from '../plot/clipped';
import type { PlotColours } from '../plot/plot-colours';
import type { PlotInstance } from '../plot/plot-instance';
import type { AttenuationColumns } from './attenuation-data';

const chevronEveryPx = 20;
const chevronHalfPx = 4.5;
/** Layers that thin out upwards. */
const washHeightsPx = [7, 14, 21];
const aloneHalfPx = 4;

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

/** One slanting piece of the wash, between two bounds or around one that stands alone. */
function washPiece(ctx: CanvasRenderingContext2D, from: Spot, to: Spot, leastPx: number): void {
  const rise = ({ y, ceilingY }: Spot): number => Math.max(ceilingY === null ? 0 : y - ceilingY, leastPx);
  ctx.beginPath();
  ctx.moveTo(from.x, from.y);
  ctx.lineTo(to.x, to.y);
  ctx.lineTo(to.x, to.y - rise(to));
  ctx.lineTo(from.x, from.y - rise(from));
  ctx.closePath();
  ctx.fill();
}

/** A light wash from each bound up to the ceiling, or a little way up where the bound is the ceiling: the truth is up there. */
export function drawWash(plot: PlotInstance, columns: AttenuationColumns, { colours, joined }: { colours: PlotColours; joined: boolean }): void {
  const spots = boundSpots(plot, columns);
  clipped(plot, (ctx, ratio) => {
    ctx.fillStyle = colours.slate;
    ctx.globalAlpha = 0.07;
    const half = aloneHalfPx * ratio;
    for (const height of washHeightsPx) {
      spots.forEach((spot, at) => {
        if (!spot) return;
        const next = joined ? spots[at + 1] : null;
        if (next) washPiece(ctx, spot, next, height * ratio);
        else if (!joined || !spots[at - 1]) washPiece(ctx, { ...spot, x: spot.x - half }, { ...spot, x: spot.x + half }, height * ratio);
      });
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

/** Where readings stand alone, so do their ceilings: a short stroke each. */
export function drawCeilingTicks(plot: PlotInstance, { frequencyHz, ceilingDb }: AttenuationColumns, colours: PlotColours): void {
  clipped(plot, (ctx, ratio) => {
    ctx.strokeStyle = colours.edge;
    ctx.lineWidth = 1.4 * ratio;
    ctx.beginPath();
    ceilingDb.forEach((db, at) => {
      if (db === null) return;
      const x = plot.valToPos(frequencyHz[at] ?? NaN, 'x', true);
      const y = plot.valToPos(db, 'y', true);
      ctx.moveTo(x - aloneHalfPx * ratio, y);
      ctx.lineTo(x + aloneHalfPx * ratio, y);
    });
    ctx.stroke();
  });
}
