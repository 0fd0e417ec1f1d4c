import { brokenBytes } from './broken-bytes.js';
import { brokenNumbers } from './broken-numbers.js';
import { brokenPhysics } from './broken-physics.js';
import { brokenStructure } from './broken-structure.js';
import { describedLayouts } from './described-layouts.js';
import type { Fixture } from './fixture.js';
import { keyPreambles } from './key-preambles.js';
import { levelsAlone } from './levels-alone.js';
import { oddShapes } from './odd-shapes.js';
import { plainTables } from './plain-tables.js';
import { severalTraces } from './several-traces.js';
import { touchstoneFiles } from './touchstone-files.js';

/** Files that hold what they should, by shape. */
export const goodFixtures: readonly Fixture[] = [...plainTables, ...severalTraces, ...keyPreambles, ...levelsAlone, ...touchstoneFiles, ...oddShapes, ...describedLayouts];

/** Files with a fault or an open question, each named after it. */
export const brokenFixtures: readonly Fixture[] = [...brokenBytes, ...brokenStructure, ...brokenNumbers, ...brokenPhysics];
