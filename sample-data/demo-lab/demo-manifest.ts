import type { InsideSizeM } from '../physics/cavity-modes.js';

/** A file of a session, and what to say about it when it is sent in. */
export interface DemoFile {
  /** Below the folder of the manifest. */
  readonly path: string;
  readonly role: 'reference' | 'enclosed' | 'noise';
  readonly sampleCode: string | null;
  readonly condition: string | null;
  readonly polarisation: 'horizontal' | 'vertical';
  readonly position: string;
  readonly measuredAt: string;
}

/** A level read off the screen by eye. */
export interface DemoLevel {
  readonly role: 'reference' | 'enclosed';
  readonly sampleCode: string | null;
  readonly condition: string | null;
  readonly frequencyHz: number;
  readonly levelDbm: number;
  readonly inTheNoise: boolean;
}

/** A bench day. */
export interface DemoSession {
  readonly key: string;
  readonly title: string;
  readonly heldOn: string;
  readonly impedanceOhm: number;
  readonly requirementKey: string;
  readonly floorMarginDb: 3 | 6 | 10;
  readonly notes: string;
  readonly files: readonly DemoFile[];
  readonly levels: readonly DemoLevel[];
}

/** All that a demo lab holds besides its people; the loader sends it in through the API. */
export interface DemoManifest {
  readonly about: string;
  readonly clients: readonly { readonly key: string; readonly name: string }[];
  readonly designs: readonly {
    readonly key: string; readonly name: string; readonly kind: string; readonly closure: string; readonly layers: number; readonly insideSizeM: InsideSizeM;
  }[];
  readonly lots: readonly {
    readonly code: string; readonly designKey: string; readonly receivedOn: string; readonly quantity: number;
  }[];
  readonly samples: readonly {
    readonly code: string; readonly name: string; readonly lotCode: string | null; readonly designKey: string; readonly clientKey: string;
    readonly insideSizeM: InsideSizeM; readonly notes: string;
  }[];
  readonly requirements: readonly {
    readonly key: string; readonly name: string; readonly rule: 'simple' | 'guarded'; readonly standsForRatio: number;
    readonly segments: readonly { readonly fromHz: number; readonly toHz: number; readonly fromDb: number; readonly toDb: number }[];
  }[];
  readonly sessions: readonly DemoSession[];
}
