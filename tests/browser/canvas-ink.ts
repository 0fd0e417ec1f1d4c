import type { Page } from 'playwright-core';

/** How many pixels of the n-th plot are drawn in about this colour. */
export function pixelsLike(page: Page, plot: number, hex: string): Promise<number> {
  return page.evaluate(({ plot: at, hex: colour }) => {
    const canvas = document.querySelectorAll<HTMLCanvasElement>('.plot-canvas canvas')[at];
    const ctx = canvas?.getContext('2d');
    if (!canvas || !ctx) return 0;
    const wanted = [1, 3, 5].map((from) => Number.parseInt(colour.slice(from, from + 2), 16));
    const { data } = ctx.getImageData(0, 0, canvas.width, canvas.height);
    let count = 0;
    for (let pixel = 0; pixel < data.length; pixel += 4) {
      const near = wanted.every((value, channel) => Math.abs((data[pixel + channel] ?? 0) - value) < 24);
      if (near && (data[pixel + 3] ?? 0) > 200) count += 1;
    }
    return count;
  }, { plot, hex });
}
