import { uploadLimits } from '@leeside/contracts/files';

/** Control characters, and signs that turn the direction of writing: they hide what a name says. */
const hidden = /[\p{Cc}\u200b-\u200f\u202a-\u202e\u2060-\u2069\ufeff]/gu;

/** The last part of a path as a name that can be shown, and whether something hidden was taken out. */
export function cleanFileName(sent: string): { name: string; hadHidden: boolean } {
  const base = sent.split(/[/\\]/).at(-1) ?? '';
  const cleaned = base.replace(hidden, '').normalize('NFC').trim().slice(0, uploadLimits.nameCharacters);
  return { name: cleaned === '' || cleaned === '.' || cleaned === '..' ? 'unnamed' : cleaned, hadHidden: hidden.test(base) };
}
