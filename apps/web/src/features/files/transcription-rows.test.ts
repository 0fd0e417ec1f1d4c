import { expect, test } from 'vitest';
import { otherDecisions, transcriptionRows } from './transcription-rows';

const transcription = {
  encoding: 'UTF-8', delimiter: ';', decimalMark: ',', frequencyUnit: 'MHz', levelUnit: 'dBµV', headerLine: 12, firstDataLine: 13, rowsKept: 401, rowsSkipped: 2,
  settings: { rbwHz: 10e3, attenuationDb: 0, referenceLevelDbm: -10, preamplifier: false, detector: 'peak' as const },
  decidedBy: { delimiter: 'counted in lines 13 to 62', rbwHz: 'line 4', levelColumns: 'their heads', 'frequency-unit': 'a person\u2019s answer: MHz', 'same-frequency': 'a person\u2019s answer: keep the first' },
};

test('each thing says what was found and by what it was decided', () => {
  const rows = transcriptionRows(transcription, 'en');
  expect(rows).toContainEqual({ what: 'columns parted by', found: 'semicolon', decidedBy: 'counted in lines 13 to 62' });
  expect(rows).toContainEqual({ what: 'resolution bandwidth', found: '10\u2009kHz', decidedBy: 'line 4' });
  expect(rows).toContainEqual({ what: 'reference level', found: '\u221210.0\u2009dBm', decidedBy: '' });
  expect(rows).toContainEqual({ what: 'preamplifier', found: 'no', decidedBy: '' });
});
test('no decision stays unsaid', () => expect(otherDecisions(transcription)).toEqual([['columns of levels', 'their heads'], ['same frequency', 'a person\u2019s answer: keep the first']]));
test('what a person answered stands where it belongs', () => {
  expect(transcriptionRows(transcription, 'en')).toContainEqual({ what: 'unit of frequency', found: 'MHz', decidedBy: 'a person\u2019s answer: MHz' });
});
test('what does not apply has no row', () => {
  expect(transcriptionRows({ ...transcription, delimiter: null }, 'en').some(({ what }) => what === 'columns parted by')).toBe(false);
});
