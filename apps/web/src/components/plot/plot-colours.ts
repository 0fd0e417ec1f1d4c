const names = ['paper', 'sheet', 'ink', 'faded', 'rule', 'edge', 'copper', 'patina', 'plum', 'ochre', 'slate'] as const;
export type PlotColours = Record<(typeof names)[number], string>;

/** The colours of the page's present theme, as the canvas needs them. */
export function plotColours(): PlotColours {
  const style = getComputedStyle(document.documentElement);
  return Object.fromEntries(names.map((name) => [name, style.getPropertyValue(`--${name}`).trim()])) as PlotColours;
}
