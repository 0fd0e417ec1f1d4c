import { describe, expect, test } from 'vitest';
import type { PlotColours } from '../plot/plot-colours';
import { attenuationColumns } from './attenuation-data';
import { attenuationLabels, attenuationOptions, attenuationSeriesData, type AttenuationSettings } from './attenuation-options';

const colours: PlotColours = {
  paper: 'paper', sheet: 'sheet', ink: 'ink', faded: 'faded', rule: 'rule', edge: 'edge', copper: 'copper', patina: 'patina', plum: 'plum', ochre: 'ochre', slate: 'slate',
};
const columns = attenuationColumns({
  frequencyHz: [1e8, 2e8, 4e8], attenuationDb: [70, 66, 60], atLeast: [true, false, false], atMostDb: [null, null, null],
  ceilingDb: [70, 72, 71], expandedUncertaintyDb: [null, null, null], requiredDb: [50, 50, 50],
}, []);
const settings = (overrides: Partial<AttenuationSettings> = {}): AttenuationSettings => ({
  columns, segments: [{ fromHz: 1e5, toHz: 1e9, fromDb: 50, toDb: 50 }], joined: true, window: { fromHz: 1e8, toHz: 4e8 },
  axisKind: 'log', range: { least: 40, most: 80 }, colours, width: 900, locale: 'en', theme: 'light', ...overrides,
});

describe('the options of the attenuation plot', () => {
  test('as many series as columns, the frequency first', () => {
    expect(attenuationOptions(settings()).series).toHaveLength(attenuationSeriesData(columns).length);
    expect(attenuationSeriesData(columns)[0]).toEqual([1e8, 2e8, 4e8]);
  });
  test('a bound has its own dash', () => {
    const { series } = attenuationOptions(settings());
    expect(series[2]?.dash).toEqual([5, 4]);
    expect(series[3]?.dash).toBeUndefined();
  });
  test('sparse readings are points without a line', () => {
    const exact = attenuationOptions(settings({ joined: false })).series[3];
    expect(exact?.points?.show).toBe(true);
    expect(typeof exact?.paths).toBe('function');
    expect(attenuationOptions(settings()).series[3]?.paths).toBeUndefined();
  });
  test('the axis is logarithmic unless asked otherwise', () => {
    expect(attenuationOptions(settings()).scales?.x?.distr).toBe(3);
    expect(attenuationOptions(settings({ axisKind: 'linear' })).scales?.x?.distr).toBe(1);
  });
  test('a requirement that ends inside the window is named there and not at the right edge', () => {
    expect(attenuationLabels(settings({ window: { fromHz: 1e8, toHz: 2e9 } })).map(({ text }) => text)).toEqual(['attenuation', 'ceiling']);
  });
  test('each thing is named at its end; no requirement, no such name', () => {
    expect(attenuationLabels(settings()).map(({ text, value }) => [text, value])).toEqual([['attenuation', 60], ['ceiling', 71], ['required', 50]]);
    expect(attenuationLabels(settings({ segments: [] })).map(({ text }) => text)).toEqual(['attenuation', 'ceiling']);
  });
});
