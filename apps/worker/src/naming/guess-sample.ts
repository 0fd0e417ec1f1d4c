/** Letters and digits of a code or name, with everything between them as one blank. */
const bare = (text: string): string => ` ${text.toLowerCase().split(/[^\p{L}\p{N}]+/u).filter((part) => part !== '').join(' ')} `;

/**
 * The sample whose code stands in a file name as whole words; the longest code where several do. A guess until somebody confirms it.
 * @param fileName name of the file.
 * @param samples codes of the lab.
 * @returns id of the sample, or null.
 * @example guessSample('enclosed_MP24-011_folded.csv', [{ id: 'a', code: 'MP24-011' }]) // 'a'
 */
export function guessSample(fileName: string, samples: readonly { id: string; code: string }[]): string | null {
  const name = bare(fileName.replace(/\.[^.]*$/, ''));
  let best: { id: string; code: string } | null = null;
  for (const sample of samples) {
    if (bare(sample.code).trim() !== '' && name.includes(bare(sample.code)) && (best === null || sample.code.length > best.code.length)) best = sample;
  }
  return best?.id ?? null;
}
