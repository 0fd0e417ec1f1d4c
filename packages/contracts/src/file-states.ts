/** States of an uploaded file. `refused` carries a problem; it can be read again. */
export const fileStates = ['waiting', 'reading', 'read', 'needs answer', 'refused'] as const;
export type FileState = (typeof fileStates)[number];
