import { pixelRatio } from './clipped';
import { placeEndLabels, type EndLabel } from './end-labels';
import type { PlotInstance } from './plot-instance';

export interface ValueLabel { text: string; colour: string; value: number }

const gapPx = 14;
const distancePx = 7;

/** Writes each series' name at its end, right of the plotting area. */
export function drawEndLabels(plot: PlotInstance, labels: readonly ValueLabel[]): void {
  const ratio = pixelRatio(plot);
  const { ctx, bbox } = plot;
  const atPixels: EndLabel[] = labels.map(({ text, colour, value }) => ({ text, colour, y: plot.valToPos(value, 'y', true) / ratio }));
  const placed = placeEndLabels(atPixels, gapPx, bbox.top / ratio + 5, (bbox.top + bbox.height) / ratio - 5);
  ctx.save();
  ctx.font = `600 ${String(12.5 * ratio)}px "Atkinson Hyperlegible Next", sans-serif`;
  ctx.textBaseline = 'middle';
  ctx.textAlign = 'left';
  for (const label of placed) {
    ctx.fillStyle = label.colour;
    ctx.fillText(label.text, bbox.left + bbox.width + distancePx * ratio, label.y * ratio);
  }
  ctx.restore();
}
