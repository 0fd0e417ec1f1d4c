import type uPlot from 'uplot';

/** The drawing library's own shapes, for the pure functions that make data and options of them. */
export type PlotInstance = uPlot;
export type PlotOptions = Omit<uPlot.Options, 'width' | 'height'>;
export type PlotColumns = uPlot.AlignedData;
export type PlotSeries = uPlot.Series;

/** Something drawn by our own hand on the canvas, under or over the series. */
export type PlotLayer = (plot: PlotInstance) => void;
