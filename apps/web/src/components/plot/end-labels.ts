export interface EndLabel { text: string; colour: string; y: number }

/** Moves labels at the end of their series apart so that none covers another; their order is kept. */
export function placeEndLabels(labels: readonly EndLabel[], gap: number, top: number, bottom: number): EndLabel[] {
  const placed = [...labels].sort((a, b) => a.y - b.y).map((label) => ({ ...label, y: Math.min(Math.max(label.y, top), bottom) }));
  for (let at = 1; at < placed.length; at += 1) {
    const above = placed[at - 1];
    const here = placed[at];
    if (above && here && here.y - above.y < gap) here.y = above.y + gap;
  }
  let limit = bottom;
  for (let at = placed.length - 1; at >= 0; at -= 1) {
    const here = placed[at];
    if (here && here.y > limit) here.y = limit;
    limit = (here?.y ?? limit) - gap;
  }
  return placed;
}

/** The last value of a column that is there, looking from the right end of the window. */
export function lastValue(frequencyHz: ArrayLike<number>, column: ArrayLike<number | null | undefined>, toHz: number): number | null {
  for (let at = column.length - 1; at >= 0; at -= 1) {
    const value = column[at];
    if ((frequencyHz[at] ?? Infinity) <= toHz && typeof value === 'number') return value;
  }
  return null;
}
