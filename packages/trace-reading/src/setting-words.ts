/** What a key of the preamble may stand for. */
export type PreambleKey =
  | 'rbw' | 'vbw' | 'start' | 'stop' | 'center' | 'span' | 'step' | 'points' | 'detector' | 'traceMode' | 'averaging' | 'held' | 'attenuation' | 'preamplifier' | 'referenceLevel' | 'sweepTime'
  | 'impedance' | 'corrections' | 'instrument' | 'serial' | 'date' | 'time' | 'levelUnit' | 'frequencyUnit' | 'axisScale' | 'markerFrequency' | 'markerLevel' | 'traceName';

const words: Readonly<Record<PreambleKey, readonly string[]>> = {
  rbw: ['rbw', 'res bw', 'resbw', 'resolution bw', 'resolution bandwidth', 'bandwidth resolution', 'auflosungsbandbreite', 'auflosebandbreite', 'zf bandbreite', 'if bandwidth', 'ifbw', 'bande passante de resolution', 'bande de resolution', 'largeur de bande de resolution', 'filtre de resolution'],
  vbw: ['vbw', 'video bw', 'video bandwidth', 'videobandbreite', 'bande passante video', 'bande video', 'filtre video'],
  start: ['start', 'start frequency', 'start freq', 'start f', 'f start', 'fstart', 'xstart', 'x start', 'frequency start', 'freq start', 'startfrequenz', 'anfangsfrequenz', 'frequence de depart', 'frequence depart', 'frequence de debut', 'frequence initiale', 'depart', 'debut'],
  stop: ['stop', 'stop frequency', 'stop freq', 'stop f', 'f stop', 'fstop', 'xstop', 'x stop', 'end frequency', 'frequency stop', 'freq stop', 'stoppfrequenz', 'stopfrequenz', 'endfrequenz', 'stopp', 'frequence d arret', 'frequence de fin', 'frequence fin', 'frequence finale', 'arret', 'fin'],
  center: ['center', 'centre', 'center frequency', 'centre frequency', 'center freq', 'centre freq', 'mittenfrequenz', 'mitte', 'frequence centrale'],
  span: ['span', 'frequency span', 'freq span', 'frequenzbereich', 'darstellbreite', 'spanne', 'excursion', 'plage', 'etendue'],
  step: ['step', 'frequency step', 'freq step', 'step frequency', 'schrittweite', 'pas'],
  points: ['points', 'point', 'num points', 'numpoints', 'number points', 'numberpoints', 'number of points', 'no of points', 'sweep points', 'trace points', 'trace length', 'values', 'punkte', 'messpunkte', 'anzahl punkte', 'anzahl messpunkte', 'anzahl der punkte', 'nombre de points', 'nb points', 'nb de points'],
  detector: ['detector', 'detector type', 'trace detector', 'detektor', 'detecteur'],
  traceMode: ['trace mode', 'mode', 'trace type', 'trace style', 'messkurvenmodus', 'kurvenmodus', 'spurmodus', 'mode de trace', 'mode trace', 'type de trace'],
  averaging: ['average type', 'averaging type', 'avg type', 'mittelungsart', 'type de moyenne', 'type de moyennage'],
  held: ['sweeps held', 'hold count', 'held', 'sweep count', 'number of sweeps', 'sweeps', 'averages', 'average count', 'avg count', 'average hold count', 'avg hold num', 'number of averages', 'count', 'mittelungen', 'anzahl mittelungen', 'anzahl sweeps', 'durchlaufe', 'anzahl durchlaufe', 'nombre de balayages', 'balayages', 'nombre de moyennes', 'moyennes'],
  attenuation: ['attenuation', 'att', 'atten', 'rf att', 'rf attenuation', 'input att', 'input attenuation', 'input atten', 'dampfung', 'eingangsdampfung', 'attenuation entree', 'attenuation d entree', 'attenuateur'],
  preamplifier: ['preamp', 'preamplifier', 'pre amp', 'pre amplifier', 'preamp state', 'vorverstarker', 'preamplificateur', 'preampli'],
  referenceLevel: ['ref level', 'reference level', 'ref lev', 'reflevel', 'referenzpegel', 'ref pegel', 'niveau de reference', 'niveau reference'],
  sweepTime: ['sweep time', 'swt', 'sweeptime', 'sweepzeit', 'wobbelzeit', 'ablaufzeit', 'temps de balayage', 'duree de balayage'],
  impedance: ['impedance', 'input impedance', 'impedanz', 'eingangsimpedanz', 'impedance d entree', 'z0'],
  corrections: ['corrections', 'correction', 'correction1', 'amplitude correction', 'amplitude corrections', 'transducer', 'korrektur', 'correction d amplitude'],
  instrument: ['model', 'model type', 'instrument', 'instrument model', 'analyzer', 'analyser', 'type', 'device', 'gerat', 'geratetyp', 'appareil', 'modele'],
  serial: ['serial', 'serial number', 'serial no', 's n', 'sn', 'seriennummer', 'numero de serie'],
  date: ['date', 'datum', 'timestamp', 'date time', 'datetime', 'date and time', 'measured', 'measured at', 'gemessen', 'mesure le', 'time stamp', 'zeitstempel', 'horodatage'],
  time: ['time', 'zeit', 'uhrzeit', 'heure'],
  levelUnit: ['y unit', 'unit y', 'unit of y', 'y axis unit', 'y axis units', 'unit', 'units', 'level unit', 'amplitude unit', 'ampl unit', 'amplitude units', 'data unit', 'einheit', 'pegeleinheit', 'y einheit', 'unite', 'unite y', 'unite de niveau', 'unite amplitude', 'unite d amplitude'],
  frequencyUnit: ['x unit', 'unit x', 'unit of x', 'x axis unit', 'x axis units', 'freq unit', 'frequency unit', 'frequency units', 'frequenzeinheit', 'x einheit', 'unite x', 'unite de frequence', 'unite frequence'],
  axisScale: ['sweep type', 'frequency scale', 'x scale', 'x axis scale', 'x axis scaling', 'frequency axis', 'sweep mode', 'skalierung x', 'echelle x'],
  markerFrequency: ['marker x axis', 'marker x', 'marker frequency', 'marker freq'],
  markerLevel: ['marker ampt', 'marker amplitude', 'marker y', 'marker level'],
  traceName: ['trace name', 'trace', 'spurname', 'nom de trace'],
};

const keyOf = new Map(Object.entries(words).flatMap(([key, list]) => list.map((word) => [word, key as PreambleKey] as const)));

/** Letters and digits of a key, without accents, in small letters, parted by single blanks. */
export function plainWords(text: string): string {
  return text.normalize('NFKD').replace(/\p{M}/gu, '').replaceAll('\u00df', 'ss').toLowerCase().replace(/\([^)]*\)|\[[^\]]*\]/g, ' ').replace(/[^\p{L}\p{N}]+/gu, ' ').trim();
}

/** What a text stands for as a key; null where it is none. */
export function preambleKeyOf(text: string): PreambleKey | null {
  const plain = plainWords(text);
  return keyOf.get(plain) ?? keyOf.get(plain.replace(/ (?:hz|khz|mhz|ghz|db|dbm|s|ms|ohm)$/, '')) ?? null;
}

/** The longest key at the beginning of a line without separators, and what follows it. */
export function leadingKey(text: string): { key: PreambleKey; rest: string } | null {
  const parts = text.trim().split(/\s+/);
  for (let count = Math.min(5, parts.length - 1); count > 0; count -= 1) {
    const key = preambleKeyOf(parts.slice(0, count).join(' '));
    if (key !== null) return { key, rest: parts.slice(count).join(' ') };
  }
  return null;
}
