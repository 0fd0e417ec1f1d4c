import type { SweepSettings } from '@leeside/trace-reading/sweep';
import type { Fixture } from './fixture.js';
import { latin1, utf16, utf8 } from './encode-text.js';
import { axisHz, dbmSweep, kept, levels, withMark, written } from './true-sweep.js';

const frequencyHz = axisHz(1_000_000_000, 500_000, 21);
const level = levels(21, 3);
const sweeps = [dbmSweep(frequencyHz, level)];
const dbuv = level.map((value) => Math.round((value + 107) * 100) / 100);
const inDbuv = [dbmSweep(frequencyHz, kept(dbuv, 'dBµV'))];
const rowsOf = (values: readonly number[], unit: 'Hz' | 'kHz' | 'MHz' | 'GHz', separator: string, mark: '.' | ',' = '.'): string =>
  frequencyHz.map((hz, at) => `${written(hz, unit, mark)}${separator}${withMark(values[at] ?? NaN, mark)}\n`).join('');
const good = (file: string, text: string, settings: SweepSettings): Fixture => ({ file, bytes: () => utf8(text), expected: { kind: 'read', sweeps, settings } });

const usual: SweepSettings = { rbwHz: 10_000, vbwHz: 30_000, detector: 'peak', traceMode: 'max hold', held: 50, attenuationDb: 10, preamplifier: false, referenceLevelDbm: -20, sweepTimeS: 0.02 };

/** Keys and values before the rows, in the styles of many makers. */
export const keyPreambles: readonly Fixture[] = [
  good('key-value-unit.csv', `Model,ANALYSER-X\nSerial Number,MY0012\nStart Frequency,1000000000,Hz\nStop Frequency,1010000000,Hz\nRBW,10000,Hz\nVBW,30000,Hz\nSweep Time,20,ms\nAttenuation,10,dB\nPreamp,Off\nReference Level,-20,dBm\nDetector,Positive Peak\nTrace Mode,Max Hold\nSweep Count,50\nPoints,21\n\nFrequency (Hz),Amplitude (dBm)\n${rowsOf(level, 'Hz', ',')}`, { ...usual, instrument: 'ANALYSER-X', serial: 'MY0012' }),
  good('key-equals-value.txt', `[Instrument]\nModel=ANALYSER-X\n[Sweep]\nStart=1 GHz\nStop=1.01 GHz\nRBW=10 kHz\nVBW=30 kHz\nSWT=20 ms\nAtt=10 dB\nPreamp=OFF\nRef Level=-20 dBm\nDetector=Pos Peak\nTrace Mode=MAXH\nSweep Count=50\nPoints=21\n[Data]\nFreq [MHz]\tLevel [dBm]\n${rowsOf(level, 'MHz', '\t')}`, usual),
  good('comment-sign-and-colon.txt', `# Instrument: ANALYSER-X\n# Date: 2026-03-02 10:11:12\n# Res BW: 10 kHz\n# Video BW: 30 kHz\n# Detector: +Peak\n# Trace: Max Hold\n# Averages: 50\n# Input Attenuation: 10 dB\n# Pre Amp: off\n# Reference Level: -20.0 dBm\n# Sweep Time: 0.020 s\n# Frequency (GHz)  Amplitude (dBm)\n${rowsOf(level, 'GHz', ' ')}`, { ...usual }),
  good('percent-comments.csv', `% RBW = 10 kHz\n% VBW = 30 kHz\n% Detector = peak\n% Trace mode = max hold\n% Sweeps held = 50\n% RF Attenuation = 10 dB\n% Preamplifier = off\n% Ref Level = -20 dBm\n% Sweep Time = 20 ms\n% f [Hz], P [dBm]\n${rowsOf(level, 'Hz', ',')}`, usual),
  good('units-in-keys.csv', `Start Freq (MHz);1000\nStop Freq (MHz);1010\nRBW (kHz);10\nVBW (kHz);30\nAttenuation (dB);10\nRef Level (dBm);-20\nSweep Time (ms);20\nDetector;Peak\nTrace Mode;Max Hold\nAverage/Hold Count;50\nPreamp;0\nData points;21\nFrequency (MHz);Level (dBm)\n${rowsOf(level, 'MHz', ';')}`, usual),
  good('units-in-key-lines-alone.csv', `X Axis Unit,Hz\nY Axis Unit,dBm\nRBW,1.0000E+04\nVBW,3.0000E+04\nDetector,POS\nTrace Mode,MAXH\nNumber of Points,21\nDATA\n${rowsOf(level, 'Hz', ',')}`, { rbwHz: 10_000, vbwHz: 30_000, detector: 'peak', traceMode: 'max hold' }),
  good('reference-level-tells-the-unit.csv', `Start Frequency: 1000.0000 MHz,\nStop Frequency: 1010.0000 MHz,\nRBW: 10kHz,\nReference Level: -20dBm,\n${frequencyHz.map((hz, at) => `${(hz / 1e6).toFixed(4)},${withMark(level[at] ?? NaN)}\n`).join('')}`, { rbwHz: 10_000, referenceLevelDbm: -20 }),
  good('quoted-keys.csv', `"Instrument","ANALYSER-X, revision 2"\n"Date","02.03.2026"\n"Time","10:11:12"\n"RBW","10 kHz"\n"Detector","RMS"\n"Trace mode","Average"\n"Averages","16"\n"Frequency [MHz]","Level [dBm]"\n${rowsOf(level, 'MHz', ',')}`, { rbwHz: 10_000, detector: 'rms', traceMode: 'average', held: 16, instrument: 'ANALYSER-X, revision 2' }),
  good('automatic-and-manual.csv', `Centre Frequency,1005 MHz,,Span,10 MHz\nRBW,10 kHz,Auto,VBW,30 kHz,Manual\nAttenuator,10 dB,Auto\nDetector,Sample\nTrace Type,Clear/Write\nFrequency [MHz],Level [dBm]\n${rowsOf(level, 'MHz', ',')}`, { rbwHz: 10_000, vbwHz: 30_000, attenuationDb: 10, detector: 'sample', traceMode: 'clear write' }),
  good('notes-of-a-person.txt', `Measured in the hall, sample 12, generator at -3 dBm, antenna 30 cm away\nThe 2nd door was open at 10:15; repeated 3 times\nRBW 10 kHz, VBW 30 kHz\n\nFrequency MHz\tLevel dBm\n${rowsOf(level, 'MHz', '\t')}`, { rbwHz: 10_000, vbwHz: 30_000 }),
  good('many-lines-before.csv', `${Array.from({ length: 180 }, (_, at) => `State ${at},${(at * 37) % 11},${at % 2 === 0 ? 'Hz' : 'dB'}\n`).join('')}RBW,10000,Hz\nFrequency [Hz],Level [dBm]\n${rowsOf(level, 'Hz', ',')}`, { rbwHz: 10_000 }),
  good('two-states-in-sections.csv', `[Channel 1]\nRBW,1 MHz\nDetector,RMS\n[Channel 2]\nRBW,10 kHz\nDetector,Peak\nFrequency [Hz],Level [dBm]\n${rowsOf(level, 'Hz', ',')}`, { rbwHz: 10_000, detector: 'peak' }),
  good('trace-section-with-mode.csv', `[Settings]\nRBW;10 kHz\nPreamplifier;On\nUnit Y;dBm\nUnit X;MHz\n[Trace 1]\nMode;Max Hold\nDetector;Quasi-Peak\n${rowsOf(level, 'MHz', ';')}`, { rbwHz: 10_000, preamplifier: true, detector: 'quasi-peak' }),
  {
    file: 'german-decimal-commas.csv', expected: { kind: 'read', sweeps: inDbuv, settings: { rbwHz: 10_000, vbwHz: 30_000, detector: 'peak', traceMode: 'max hold', attenuationDb: 10, held: 20 }, doubts: ['not-utf-8'] },
    bytes: () => latin1(`Gerät;Prüfempfänger 3\nDatum;02.03.2026\nUhrzeit;10:11:12\nStartfrequenz;1000 MHz\nStoppfrequenz;1010 MHz\nAuflösebandbreite;10 kHz\nVideobandbreite;30 kHz\nDetektor;Spitzenwert\nMessmodus;Max Hold\nAnzahl Durchläufe;20\nEingangsdämpfung;10 dB\nVorverstärker;aus\nMesspunkte;21\nFrequenz [MHz];Pegel [dBµV]\n${rowsOf(dbuv, 'MHz', ';', ',')}`),
  },
  {
    file: 'french-tabs.txt', expected: { kind: 'read', sweeps, settings: { rbwHz: 10_000, vbwHz: 30_000, detector: 'peak', traceMode: 'max hold', attenuationDb: 10 } },
    bytes: () => utf8(`Appareil\tANALYSEUR-X\nFréquence de départ\t1 GHz\nFréquence d'arrêt\t1,01 GHz\nBande passante de résolution\t10 kHz\nBande passante vidéo\t30 kHz\nDétecteur\tCrête\nMode de trace\tMaintien max\nAtténuation\t10 dB\nNombre de points\t21\nFréquence (MHz)\tNiveau (dBm)\n${rowsOf(level, 'MHz', '\t', ',')}`),
  },
  {
    file: 'italian-semicolons.csv', expected: { kind: 'read', sweeps, settings: { rbwHz: 10_000 } },
    bytes: () => utf8(`Strumento;ANALIZZATORE-X\nRBW;10 kHz\nRivelatore;Picco\nPunti;21\nFrequenza [MHz];Livello [dBm]\n${rowsOf(level, 'MHz', ';', ',')}`),
  },
  {
    file: 'spanish-utf-16.csv', expected: { kind: 'read', sweeps, settings: { rbwHz: 10_000 } },
    bytes: () => utf16(`Instrumento;ANALIZADOR-X\r\nRBW;10 kHz\r\nDetector;Pico\r\nNúmero de puntos;21\r\nFrecuencia (MHz);Nivel (dBm)\r\n${rowsOf(level, 'MHz', ';', ',').replaceAll('\n', '\r\n')}`, 'little'),
  },
  {
    file: 'field-strength.csv', expected: { kind: 'read', sweeps: [{ unit: 'dB\u00b5V/m', frequencyHz, level: dbuv }] },
    bytes: () => utf8(`Antenna,horn 1\nRBW,10 kHz\nFrequency [MHz],Field strength [dBµV/m]\n${rowsOf(dbuv, 'MHz', ',')}`),
  },
];
