import { clipped, pixelRatio } from '../plot/clipped';
import type { PlotColours } from '../plot/plot-colours';
import type { PlotInstance } from '../plot/plot-instance';
import { nameOfWall, wallTop, type Segment, type WallPoint } from './requirement-wall';

const hatchStepPx = 8;

function wallPath(plot: PlotInstance, top: readonly WallPoint[], closed: boolean): Path2D {
  const path = new Path2D();
  const bottom = plot.bbox.top + plot.bbox.height;
  top.forEach(({ hz, db }, at) => {
    const x = plot.valToPos(hz, 'x', true);
    const y = plot.valToPos(db, 'y', true);
    if (at === 0 && closed) path.moveTo(x, bottom);
    if (at === 0 && !closed) path.moveTo(x, y);
    else path.lineTo(x, y);
    if (at === top.length - 1 && closed) path.lineTo(x, bottom);
  });
  if (closed) path.closePath();
  return path;
}

function hatch(plot: PlotInstance, ctx: CanvasRenderingContext2D, stepPx: number): void {
  const { left, top, width, height } = plot.bbox;
  ctx.beginPath();
  for (let x = left - height; x < left + width; x += stepPx) {
    ctx.moveTo(x, top + height);
    ctx.lineTo(x + height, top);
  }
  ctx.stroke();
}

/** A wall that ends inside the plot is named at its own end. */
function nameWall(plot: PlotInstance, ctx: CanvasRenderingContext2D, end: WallPoint, colours: PlotColours): void {
  const ratio = pixelRatio(plot);
  ctx.font = `600 ${String(12.5 * ratio)}px "Atkinson Hyperlegible Next", sans-serif`;
  ctx.fillStyle = colours.faded;
  ctx.textBaseline = 'middle';
  ctx.textAlign = 'left';
  ctx.fillText('required', plot.valToPos(end.hz, 'x', true) + 7 * ratio, plot.valToPos(end.db, 'y', true) + 9 * ratio);
}

/** The requirement: a hatched wall rising from below, over which the curve must stay. */
export function drawWall(plot: PlotInstance, segments: readonly Segment[], colours: PlotColours): void {
  const { min, max } = plot.scales.x ?? {};
  if (min === undefined || max === undefined) return;
  clipped(plot, (ctx, ratio) => {
    for (const segment of segments) {
      const top = wallTop(segment, { fromHz: min, toHz: max });
      if (!top) continue;
      ctx.save();
      ctx.clip(wallPath(plot, top, true));
      ctx.strokeStyle = colours.edge;
      ctx.globalAlpha = 0.55;
      ctx.lineWidth = ratio;
      hatch(plot, ctx, hatchStepPx * ratio);
      ctx.restore();
      ctx.strokeStyle = colours.faded;
      ctx.lineWidth = 2 * ratio;
      ctx.stroke(wallPath(plot, top, false));
    }
    const name = nameOfWall(segments, { fromHz: min, toHz: max });
    if (name?.at === 'own end') nameWall(plot, ctx, name, colours);
  });
}
