/** Layouts of analyzers, told by shape; invented numbers. Each with what a careful reader must make of it. */
export interface LayoutSample {
  readonly name: string;
  readonly fileName: string;
  readonly text: string;
  readonly encoding?: 'utf-8' | 'utf-16le with mark' | 'utf-16le' | 'utf-16be with mark' | 'windows-1252';
  /** First sweep: frequencies in Hz and levels in its kept unit; null where a question is right. */
  readonly expected: { readonly unit: 'dBm' | 'dB' | 'dB\u00b5V/m'; readonly frequencyHz: readonly number[]; readonly level: readonly number[]; readonly sweeps?: number } | { readonly question: string } | { readonly refusal: string; readonly line?: number };
}

const nul = '\u0000';
const apart = 106.98970004336019;
const dbm = (...levels: readonly number[]): number[] => levels.map((level) => level - apart);

export const layoutSamples: readonly LayoutSample[] = [
  {
    name: 'an instruction to a spreadsheet, then key;value;unit; and rows that end in the separator', fileName: 'a.csv',
    text: 'sep=;\nType;ANALYSER-X;\nDate;02.Feb 2020;\nStart;0.000000;Hz;\nStop;50000000.000000;Hz;\nRBW;100000.000000;Hz;\nx-Unit;Hz;\ny-Unit;dBm;\nTrace Mode;MAXHOLD;\nValues;5;\n4995004.995004995;-71.25;\n14985014.985014985;-70.5;\n24975024.975024976;-70.75;\n34965034.96503496;-71;\n44955044.955044955;-72.5;\n',
    expected: { unit: 'dBm', frequencyHz: [4995004.995004995, 14985014.985014985, 24975024.975024976, 34965034.96503496, 44955044.955044955], level: [-71.25, -70.5, -70.75, -71, -72.5] },
  },
  {
    name: 'sections in brackets, the level in the first column', fileName: 'b.csv',
    text: 'Sweep 1,1/2/2020 09:00:00\n[Global Parameters]\nInput Bandwidth,0,Hz\n,40000000,Hz\n[Marker M0]\nFrequency,---,,\n[Trace]\nTrace 1,,dBuVPerMeter,-0.0001,0.0003\nNumberPoints,3\nXStart,1000000,Hz\nXStop,1666666.66666666666666666667,Hz\n41.25,1000000\n39.5,1333333.33333333333333333333\n40,1666666.66666666666666666667\n',
    expected: { unit: 'dB\u00b5V/m', frequencyHz: [1e6, 1333333.3333333333, 1666666.6666666667], level: [41.25, 39.5, 40] },
  },
  {
    name: 'one comment line names the columns', fileName: 'c.txt', text: '# f[Hz], a[dB]\n1.000000000000000000e+07,2.150000000000000000e+01\n1.250000000000000000e+07,2.250000000000000000e+01\n1.500000000000000000e+07,2.175000000000000000e+01\n',
    expected: { unit: 'dB', frequencyHz: [1e7, 1.25e7, 1.5e7], level: [21.5, 22.5, 21.75] },
  },
  {
    name: 'comments with key and value, data between BEGIN and END', fileName: 'd.csv', text: '! FILETYPE CSV\n! TIMESTAMP Monday, 3 February 2020 10:00:00\n! CORRECTION1 OFF\n! DATA Freq,S21\n! FREQ UNIT Hz\n! DATA UNIT dB\nBEGIN\n1000000,-1.25\n2000000,-1.5\nEND\n',
    expected: { unit: 'dB', frequencyHz: [1e6, 2e6], level: [-1.25, -1.5] },
  },
  { name: 'nothing but numbers', fileName: 'e.txt', text: '470.000\t-101.50\n470.535\t-99.25\n471.071\t-100.75\n471.607\t-98.00\n', expected: { question: 'frequency-unit' } },
  {
    name: 'key: value, and zero-padded megahertz', fileName: 'f.csv', text: 'Model Type: HANDY1,\nTrace Type: Live,\nStart Frequency: 0100.0000 MHz,\nStop Frequency: 0101.0000 MHz,\nRBW:    15kHz,\nReference Level:   -20dBm,\nFixed Offset: Off,-010.0dB,\n0100.0000,-098.5\n0100.2500,-097.0\n0100.5000,-098.0\n0100.7500,-097.5\n0101.0000,-098.7\n',
    expected: { unit: 'dBm', frequencyHz: [100e6, 100.25e6, 100.5e6, 100.75e6, 101e6], level: [-98.5, -97, -98, -97.5, -98.7] },
  },
  {
    name: 'Touchstone with its option line first', fileName: 'g.s2p', text: '#  HZ   S   DB   R     50.00 \n! Two ports - version 1\n! Measurements: S11 S21 S12 S22 \n! \n 1.000000E7   -2.10E1  1.0E2  -1.002E1  5.5  -1.001E1  5.5  -2.2E1  9.0E1 \n 2.000000E7   -2.15E1  1.1E2  -1.004E1  4.5  -1.003E1  4.5  -2.3E1  9.1E1 \n',
    expected: { unit: 'dB', frequencyHz: [1e7, 2e7], level: [-10.02, -10.04], sweeps: 2 },
  },
  {
    name: 'a wide sweep in rows of bins, pieces out of order, two sweeps', fileName: 'h.csv',
    text: '2020-02-02, 09:00:00.10, 100000000, 105000000, 1666666.67, 12, -61.5, -62.0, -60.5\n2020-02-02, 09:00:00.10, 110000000, 115000000, 1666666.67, 12, -63.5, -61.0, -62.5\n2020-02-02, 09:00:00.10, 105000000, 110000000, 1666666.67, 12, -60.0, -64.0, -61.5\n2020-02-02, 09:00:05.10, 100000000, 105000000, 1666666.67, 12, -61.0, -62.5, -60.0\n2020-02-02, 09:00:05.10, 110000000, 115000000, 1666666.67, 12, -63.0, -61.5, -62.0\n2020-02-02, 09:00:05.10, 105000000, 110000000, 1666666.67, 12, -60.5, -64.5, -61.0\n',
    expected: { unit: 'dB', sweeps: 2, frequencyHz: Array.from({ length: 9 }, (_, at) => 100e6 + ((at + 0.5) * 5e6) / 3), level: [-61.5, -62, -60.5, -60, -64, -61.5, -63.5, -61, -62.5] },
  },
  {
    name: 'row numbers first, units glued to the cells', fileName: 'i.csv', text: 'Title:,Trace 1,\nCenter Frequency:,5000000,Hz\nResolution Bandwidth:,300,Hz\nNum Points:,3,\n ,,\nNo.,Frequency,Amplitude\n1,0.000000Hz,-4.500000000e+00dBm\n2,5000000.000000Hz,-7.250000000e+01dBm\n3,10000000.000000Hz,-7.300000000e+01dBm',
    expected: { unit: 'dBm', frequencyHz: [0, 5e6, 1e7], level: [-4.5, -72.5, -73] },
  },
  {
    name: 'traces as columns under "Trace Data", the unit with a Greek letter', fileName: 'j.csv', text: 'X Axis Unit,Hz\nY Axis Unit,dB\u03bcV\nNumber of Points,3\nMarker,1,2,3\nMarker X Axis,500.00,,\nMarker Ampt,-55.50,,\nTrace Name,Trace A\nTrace Type,Max Hold\nTrace Data\n0,101.50\n500,51.49\n1000,50.25\nTrace Name,Trace B\nTrace Type,Blank\n',
    expected: { unit: 'dBm', frequencyHz: [0, 500, 1000], level: dbm(101.5, 51.49, 50.25) },
  },
  {
    name: 'a zero byte after every cell', fileName: 'k.csv',
    text: `File:${nul},/disk/TST.CSV${nul}\nSystem Parameter:${nul},Default Unit:dBm/Hz/s${nul}\nStart Freq${nul},1000000.000000${nul},Stop Freq${nul},3000000.000000${nul}\nVBW${nul},10000.000000${nul},AUTO${nul},RBW${nul},10000.000000${nul},MAN${nul}\n${nul}\nTrace Data:(Unit:dBuV)${nul}\nFrequency(Hz)${nul},Trace1(VIEW)${nul},${nul}\n1000000.000000${nul},42.50${nul},${nul}\n2000000.000000${nul},43.25${nul},${nul}\n3000000.000000${nul},42.75${nul},${nul}\n`,
    expected: { unit: 'dBm', frequencyHz: [1e6, 2e6, 3e6], level: dbm(42.5, 43.25, 42.75) },
  },
  {
    name: 'notes with numbers in them, a column of zeros', fileName: 'l.txt', text: '#S21 Log Magnitude Measured 2/2/20\n#DUT: type AB|C-100, S/N=7, nominal CF=100MHz\n#As measured: CF=0.101GHz, bandpass=12.5MHz, loss=-.5dB\n#3 point scan, 20kHz-200MHz\n\n2.00000000E+04, -7.51000000E+01,  0.00000000E+00\n1.00010000E+08, -5.00000000E-01,  0.00000000E+00\n2.00000000E+08, -6.92000000E+01,  0.00000000E+00\n',
    expected: { unit: 'dB', frequencyHz: [2e4, 1.0001e8, 2e8], level: [-75.1, -0.5, -69.2] },
  },
  {
    name: 'German words, semicolons and decimal commas', fileName: 'm.csv', encoding: 'windows-1252', text: 'Ger\u00e4t;Pr\u00fcfempf\u00e4nger 3\nStartfrequenz;30;MHz\nStoppfrequenz;32;MHz\nAufl\u00f6sungsbandbreite;10;kHz\nDetektor;Spitze\nAnzahl Punkte;3\nFrequenz [MHz];Pegel [dB\u00b5V]\n30,0;31,5\n31,0;32,25\n32,0;30,75\n',
    expected: { unit: 'dBm', frequencyHz: [30e6, 31e6, 32e6], level: dbm(31.5, 32.25, 30.75) },
  },
  {
    name: 'French words, tabs', fileName: 'n.txt', text: 'Appareil\tanalyseur 2\nFr\u00e9quence de d\u00e9part\t1 GHz\nFr\u00e9quence d\u2019arr\u00eat\t1,002 GHz\nNombre de points\t3\nFr\u00e9quence (GHz)\tNiveau (dBm)\n1,000\t-40,5\n1,001\t-41,25\n1,002\t-40\n',
    expected: { unit: 'dBm', frequencyHz: [1e9, 1.001e9, 1.002e9], level: [-40.5, -41.25, -40] },
  },
  {
    name: 'levels alone, by centre and span', fileName: 'o.csv', text: 'Center Frequency,100 MHz\nSpan,4 MHz\nSweep Points,5\nY Unit,dBm\n-40.5\n-41\n-42.5\n-41.25\n-40\n',
    expected: { unit: 'dBm', frequencyHz: [98e6, 99e6, 100e6, 101e6, 102e6], level: [-40.5, -41, -42.5, -41.25, -40] },
  },
  {
    name: 'UTF-16 with its mark', fileName: 'p.csv', encoding: 'utf-16le with mark', text: 'Frequency [MHz],Level [dB\u00b5V]\r\n100,40\r\n101,41.5\r\n102,40.25\r\n', expected: { unit: 'dBm', frequencyHz: [100e6, 101e6, 102e6], level: dbm(40, 41.5, 40.25) },
  },
  { name: 'UTF-16 without its mark', fileName: 'q.csv', encoding: 'utf-16le', text: 'Frequency [MHz],Level [dBm]\r\n100,-40\r\n101,-41.5\r\n102,-40.25\r\n', expected: { unit: 'dBm', frequencyHz: [100e6, 101e6, 102e6], level: [-40, -41.5, -40.25] } },
  { name: 'UTF-16, the other order', fileName: 'r.csv', encoding: 'utf-16be with mark', text: 'Frequency [MHz];Level [dBm]\n100;-40,5\n101;-41\n', expected: { unit: 'dBm', frequencyHz: [100e6, 101e6], level: [-40.5, -41] } },
  {
    name: 'several traces with a line of units', fileName: 's.csv', text: 'Frequency,Trace 1,Trace 2,Limit\nMHz,dBm,dBm,dBm\n1,-50,-60,-30\n2,-51,-61.5,-30\n3,-52.5,-62,-30\n', expected: { unit: 'dBm', sweeps: 2, frequencyHz: [1e6, 2e6, 3e6], level: [-50, -51, -52.5] },
  },
  { name: 'a complex transmission', fileName: 't.csv', text: 'Freq(Hz),S21(REAL),S21(IMAG)\n1000000000,0.6,0.8\n1100000000,0.06,0.08\n', expected: { unit: 'dB', frequencyHz: [1e9, 1.1e9], level: [0, -20] } },
  { name: 'a table on its side', fileName: 'u.csv', text: 'Frequency [MHz],10,20,30,40\nLevel [dBm],-50,-51.5,-52,-53\n', expected: { unit: 'dBm', frequencyHz: [10e6, 20e6, 30e6, 40e6], level: [-50, -51.5, -52, -53] } },
  { name: 'quoted cells', fileName: 'at.csv', text: '"Frequency, MHz","Level (dBm)"\n"100","-40.5"\n"200","-41.25"\n', expected: { unit: 'dBm', frequencyHz: [1e8, 2e8], level: [-40.5, -41.25] } },
  { name: 'a falling sweep', fileName: 'v.csv', text: 'Frequency [MHz],Level [dBm]\n30,-52\n20,-51\n10,-50\n', expected: { unit: 'dBm', frequencyHz: [10e6, 20e6, 30e6], level: [-50, -51, -52] } },
  { name: 'CR alone ends lines, bars part columns', fileName: 'w.txt', text: 'Frequency [kHz]|Level [dBm]\r100|-50\r200|-51\r300|-52.25\r', expected: { unit: 'dBm', frequencyHz: [1e5, 2e5, 3e5], level: [-50, -51, -52.25] } },
  { name: 'blanks part columns', fileName: 'x.txt', text: '  Frequency(MHz)   Amplitude(dBm)\n   100.0   -50.5\n   200.0   -51.25\n   300.0   -52\n', expected: { unit: 'dBm', frequencyHz: [1e8, 2e8, 3e8], level: [-50.5, -51.25, -52] } },
  { name: 'milliwatts', fileName: 'y.csv', text: 'Frequency [MHz],Power [mW]\n100,1\n200,0.001\n300,1e-6\n', expected: { unit: 'dBm', frequencyHz: [1e8, 2e8, 3e8], level: [0, -30, -60] } },
  { name: 'real minus signs and exponents with D', fileName: 'z.csv', text: 'Frequency [Hz],Level [dBm]\n1D8,\u221250.5\n2D8,\u221251\n3D8,+.5\n', expected: { unit: 'dBm', frequencyHz: [1e8, 2e8, 3e8], level: [-50.5, -51, 0.5] } },
  { name: 'a value that is none', fileName: 'aa.csv', text: 'Frequency [MHz],Level [dBm]\n1,-50\n2,----\n3,-52\n4,-53\n', expected: { unit: 'dBm', frequencyHz: [1e6, 3e6, 4e6], level: [-50, -52, -53] } },
  { name: 'many values that are none', fileName: 'au.csv', text: 'Frequency [MHz],Level [dBm]\n1,-50\n2,----\n3,9.91E+37\n4,-53\n', expected: { question: 'gaps' } },
  { name: 'a limit table before the trace', fileName: 'ab.csv', text: 'Limit Line 1\nFrequency [MHz],Limit [dBm]\n1,-30\n10,-30\n\nTrace 1\nFrequency [MHz],Level [dBm]\n1,-50\n2,-51\n3,-52\n4,-53\n', expected: { unit: 'dBm', frequencyHz: [1e6, 2e6, 3e6, 4e6], level: [-50, -51, -52, -53] } },
  { name: 'Touchstone 2, parameters by row, pairs of real and imaginary part', fileName: 'ac.ts', text: '[Version] 2.0\n# GHz S RI R 50\n[Number of Ports] 2\n[Two-Port Data Order] 12_21\n[Number of Frequencies] 2\n[Network Data]\n1 0 0 0.01 0 0.1 0 0 0\n2 0 0 0.02 0 0.2 0 0 0\n[End]\n', expected: { unit: 'dB', sweeps: 2, frequencyHz: [1e9, 2e9], level: [-20, -13.979400086720375] } },
  { name: 'Touchstone without any ending, options out of order', fileName: 'ad.txt', text: '! a pad\n# r 50 ma s mhz\n100 0.1 0 0.5 10 0.5 10 0.1 0 ! first\n200 0.1 0 0.25 10 0.25 10 0.1 0\n', expected: { unit: 'dB', sweeps: 2, frequencyHz: [1e8, 2e8], level: [-6.020599913279624, -12.041199826559248] } },
  { name: 'a block prefix of the instrument bus', fileName: 'ae.csv', text: '#250Frequency [MHz],Level [dBm]\n100,-40.5\n200,-41.25\n', expected: { unit: 'dBm', frequencyHz: [1e8, 2e8], level: [-40.5, -41.25] } },
  {
    name: 'row numbers without a name, the axis from start and stop', fileName: 'al.csv', text: 'Start,100 MHz\nStop,104 MHz\nPoints,5\nUnit,dBm\n0,-40.5\n1,-41\n2,-42.5\n3,-41.25\n4,-40\n',
    expected: { unit: 'dBm', frequencyHz: [100e6, 101e6, 102e6, 103e6, 104e6], level: [-40.5, -41, -42.5, -41.25, -40] },
  },
  { name: 'levels over time', fileName: 'am.csv', text: 'Center,100 MHz\nSpan,0 Hz\nTime [s],Level [dBm]\n0.0,-40.5\n0.1,-41\n0.2,-42.5\n', expected: { refusal: 'zero-span' } },
  { name: 'a row with a value missing', fileName: 'an.csv', text: 'Frequency [MHz],Level [dBm]\n100,-40.5\n200\n300,-42\n', expected: { refusal: 'ragged-row', line: 3 } },
  { name: 'a word among the numbers', fileName: 'ao.csv', text: 'Frequency [MHz],Level [dBm]\n100,-40.5\n200,0x10\n300,-42\n', expected: { refusal: 'bad-number', line: 3 } },
  { name: 'a number out of range', fileName: 'ap.csv', text: 'Frequency [MHz],Level [dBm]\n100,-40.5\n200,1e400\n300,-42\n', expected: { refusal: 'number-out-of-range', line: 3 } },
  { name: 'a header and nothing below', fileName: 'aq.csv', text: 'Frequency [MHz],Level [dBm]\n', expected: { refusal: 'no-data' } },
  { name: 'blanks alone', fileName: 'ar.csv', text: ' \n\t\n', expected: { refusal: 'empty-file' } },
  { name: 'a negative frequency', fileName: 'as.csv', text: 'Frequency [MHz],Level [dBm]\n-1,-40.5\n0,-41\n1,-42\n', expected: { refusal: 'bad-frequency', line: 2 } },
  { name: 'no unit of the level anywhere', fileName: 'af.csv', text: 'Frequency [MHz],Trace 1\n100,-40.5\n200,-41.25\n', expected: { question: 'level-unit' } },
  { name: 'a comma before three digits throughout', fileName: 'ag.csv', text: 'Frequency [MHz];Level [dBm]\n1,000;-40,500\n2,000;-41,250\n', expected: { question: 'decimal-mark' } },
  { name: 'another number of points than stated', fileName: 'ah.csv', text: 'Number of Points,4\nFrequency [MHz],Level [dBm]\n100,-40.5\n200,-41.25\n300,-42\n', expected: { question: 'point-count' } },
  { name: 'two units for the frequency', fileName: 'ai.csv', text: 'X Axis Unit,Hz\nFrequency [MHz],Level [dBm]\n100,-40.5\n200,-41.25\n', expected: { question: 'frequency-unit' } },
  { name: 'the same frequency twice with different levels', fileName: 'aj.csv', text: 'Frequency [MHz],Level [dBm]\n100,-40.5\n100,-41.25\n200,-42\n', expected: { question: 'same-frequency' } },
  { name: 'a frequency out of order', fileName: 'ak.csv', text: 'Frequency [MHz],Level [dBm]\n100,-40.5\n300,-41.25\n200,-42\n400,-43\n', expected: { question: 'frequency-order' } },
];
