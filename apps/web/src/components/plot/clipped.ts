import type { PlotInstance } from './plot-instance';

/** Canvas pixels per CSS pixel. */
export const pixelRatio = (plot: PlotInstance): number => plot.ctx.canvas.width / plot.width;

/** Draws inside the plotting area alone and leaves the brush as it was. */
export function clipped(plot: PlotInstance, draw: (ctx: CanvasRenderingContext2D, ratio: number) => void): void {
  const { ctx, bbox } = plot;
  ctx.save();
  ctx.beginPath();
  ctx.rect(bbox.left, bbox.top, bbox.width, bbox.height);
  ctx.clip();
  draw(ctx, pixelRatio(plot));
  ctx.restore();
}
