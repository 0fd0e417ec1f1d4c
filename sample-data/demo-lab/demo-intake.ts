import type { InsideSizeM } from '../physics/cavity-modes.js';
import type { DemoManifest } from './demo-manifest.js';

const pouchM: InsideSizeM = [0.2, 0.12, 0.02];
const bagM: InsideSizeM = [0.4, 0.3, 0.05];
const boxM: InsideSizeM = [0.18, 0.12, 0.06];

/** What came to the demo lab and what is asked of it. All names and codes are invented. */
export const demoIntake: Omit<DemoManifest, 'about' | 'sessions'> = {
  clients: [{ key: 'client-a', name: 'Hollin Outdoor Goods' }, { key: 'client-b', name: 'Quarry Lane Instruments' }],
  designs: [
    { key: 'marram', name: 'Marram folded pouch', kind: 'pouch', closure: 'seam folded twice', layers: 2, insideSizeM: pouchM },
    { key: 'sallow', name: 'Sallow roll-top bag', kind: 'bag', closure: 'rolled three times', layers: 2, insideSizeM: bagM },
    { key: 'teasel', name: 'Teasel clasp box', kind: 'box', closure: 'two clasps on a gasket', layers: 1, insideSizeM: boxM },
  ],
  lots: [
    { code: 'MP24', designKey: 'marram', receivedOn: '2026-10-26', quantity: 40 },
    { code: 'MP25', designKey: 'marram', receivedOn: '2026-11-12', quantity: 60 },
  ],
  samples: [
    { code: 'MP24-011', name: 'Pouch 11', lotCode: 'MP24', designKey: 'marram', clientKey: 'client-a', insideSizeM: pouchM, notes: 'As delivered.' },
    { code: 'MP24-014', name: 'Pouch 14', lotCode: 'MP24', designKey: 'marram', clientKey: 'client-a', insideSizeM: pouchM,
      notes: 'Opened and folded 500 times; the coating is worn along the seam.' },
    { code: 'MP25-003', name: 'Pouch 3', lotCode: 'MP25', designKey: 'marram', clientKey: 'client-a', insideSizeM: pouchM, notes: 'As delivered.' },
    { code: 'SR-102', name: 'Roll-top bag 102', lotCode: null, designKey: 'sallow', clientKey: 'client-a', insideSizeM: bagM, notes: 'As delivered.' },
    { code: 'TC-007', name: 'Clasp box 7', lotCode: null, designKey: 'teasel', clientKey: 'client-b', insideSizeM: boxM, notes: 'Gasket new.' },
    { code: 'TC-009', name: 'Clasp box 9', lotCode: null, designKey: 'teasel', clientKey: 'client-b', insideSizeM: boxM, notes: 'One clasp bent.' },
  ],
  requirements: [
    { key: 'portable', name: 'Portable enclosures: 50 dB to 1 GHz, then falling to 30 dB at 6 GHz', rule: 'simple', standsForRatio: 1.1,
      segments: [{ fromHz: 3e7, toHz: 1e9, fromDb: 50, toDb: 50 }, { fromHz: 1e9, toHz: 6e9, fromDb: 46, toDb: 30 }] },
    { key: 'rule-of-thumb', name: 'Rule of thumb: at least 50 dB from 100 kHz to 1 GHz (common practice, no source)', rule: 'simple', standsForRatio: 1.1,
      segments: [{ fromHz: 1e5, toHz: 1e9, fromDb: 50, toDb: 50 }] },
  ],
};
