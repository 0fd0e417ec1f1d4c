import { randomUUID } from 'node:crypto';
import { peakOf } from '@leeside/attenuation/peak-level';
import type { ClaimedFile } from '@leeside/database/file-reading-store';
import type { NewTrace } from '@leeside/database/trace-store';
import type { ReadSweep } from '@leeside/trace-reading/transcription';
import { guessRole } from '../naming/guess-role.js';
import { guessSample } from '../naming/guess-sample.js';

function measuredAtOf(file: ClaimedFile, read: ReadSweep): string | null {
  const stated = file.fields.measuredAt ?? read.measuredAt;
  if (stated === undefined) return null;
  const time = Date.parse(stated);
  return Number.isNaN(time) ? null : new Date(time).toISOString();
}

/** The traces of a file, with what its upload said of it, else what its name seems to say. */
export function traceRows(file: ClaimedFile, sweeps: readonly ReadSweep[], samples: readonly { id: string; code: string }[]): NewTrace[] {
  const { fields } = file;
  const role = fields.role ?? guessRole(file.name);
  const isEnclosed = role === 'enclosed';
  const sampleId = isEnclosed ? (fields.sampleId ?? guessSample(file.name, samples)) : null;
  return sweeps.map((read, placeInFile) => ({
    id: randomUUID(), fileId: file.id, placeInFile, name: read.name, role, roleGuessed: fields.role === undefined && role !== null,
    sampleId, sampleGuessed: sampleId !== null && fields.sampleId === undefined,
    condition: fields.condition ?? '', polarisation: fields.polarisation ?? '', position: fields.position ?? '', measuredAt: measuredAtOf(file, read),
    chainLossDb: fields.chainLossDb ?? null, transmitLevelDbm: fields.transmitLevelDbm ?? null, pointCount: read.sweep.level.length,
    startHz: read.sweep.frequencyHz[0] ?? 0, stopHz: read.sweep.frequencyHz.at(-1) ?? 0, levelUnit: read.sweep.levelUnit, settings: read.sweep.settings, peak: peakOf(read.sweep),
  }));
}
