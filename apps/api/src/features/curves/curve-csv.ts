import type { CurveColumns } from '@leeside/database/curve-result-store';

const header = ['frequency_hz', 'bound', 'attenuation_db', 'at_most_db', 'ceiling_db', 'required_db', 'expanded_uncertainty_db', 'reference_level', 'enclosed_level', 'floor_level'];

/** Seven digits carry all that a float32 holds. */
const text = (value: number | undefined): string => (value === undefined || Number.isNaN(value) ? '' : String(Number(value.toPrecision(7))));

/** The exact numbers, decimal point, units in the header; a lower bound carries ">=" in its own column. */
export function curveCsv(points: CurveColumns): string {
  const rows = Array.from(points.frequencyHz, (frequencyHz, at) => [
    String(frequencyHz), points.atLeast[at] === 1 ? '>=' : '', text(points.attenuationDb[at]), text(points.atMostDb[at]), text(points.ceilingDb[at]), text(points.requiredDb[at]),
    text(points.expandedUncertaintyDb[at]), text(points.referenceLevel[at]), text(points.enclosedLevel[at]), text(points.floorLevel[at]),
  ].join(','));
  return `${[header.join(','), ...rows].join('\r\n')}\r\n`;
}
