import type { MeasuringRole } from '@leeside/contracts/measuring-roles';

/** Words that people put into file names, in English, German and French; the first role with a word in the name wins. */
const words: readonly (readonly [MeasuringRole, readonly string[]])[] = [
  ['noise', ['noise', 'floor', 'noisefloor', 'rauschen', 'bruit', 'generatoroff', 'off', 'aus', 'rfoff']],
  ['leakage', ['leakage', 'leak', 'crosstalk', 'leck', 'fuite']],
  ['ambient', ['ambient', 'background', 'umgebung', 'ambiant']],
  ['reference', ['reference', 'ref', 'open', 'unshielded', 'without', 'referenz', 'offen', 'ohne', 'ouvert', 'sans']],
  ['enclosed', ['enclosed', 'enc', 'inside', 'shielded', 'closed', 'covered', 'with', 'bag', 'pouch', 'box', 'case', 'sleeve', 'innen', 'geschlossen', 'mit', 'dedans', 'ferme', 'avec']],
];

/** The words of a file name: split at anything that is no letter, and where small letters meet capitals or digits. */
function wordsOfName(fileName: string): string[] {
  return fileName.replace(/\.[^.]*$/, '').normalize('NFKD').replace(/\p{M}/gu, '').replace(/(\p{Ll})(\p{Lu})/gu, '$1 $2').toLowerCase().split(/[^\p{L}]+/u).filter((word) => word !== '');
}

/**
 * What a file probably is, by words in its name. A guess: it is shown as one until somebody confirms it.
 * @example guessRole('2026-03-02_ref-open.csv') // 'reference'
 */
export function guessRole(fileName: string): MeasuringRole | null {
  const found = new Set(wordsOfName(fileName));
  return words.find(([, list]) => list.some((word) => found.has(word)))?.[0] ?? null;
}
