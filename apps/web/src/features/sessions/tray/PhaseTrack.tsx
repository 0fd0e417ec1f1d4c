import type { FileState } from '@leeside/contracts/file-states';
import { formatNumber } from '@leeside/units/format-quantity';
import { readerLocale } from '../../../components/reader-locale';
import type { LocalUpload } from './upload-store';

type Standing = 'done' | 'now' | 'open' | 'asks' | 'stuck';
const looks: Record<Standing, string> = {
  asks: 'border-ochre text-ochre font-semibold',
  done: 'border-patina text-faded', now: 'border-copper text-ink font-semibold', open: 'border-rule text-faded', stuck: 'border-plum text-plum font-semibold',
};

function Track({ steps }: { steps: readonly [string, Standing][] }) {
  return (
    <ol className="grid w-60 max-w-full list-none grid-cols-3 gap-1">
      {steps.map(([word, standing]) => <li key={word} className={`border-t-4 pt-0.5 text-xs whitespace-nowrap ${looks[standing]}`} aria-current={standing === 'now' ? 'step' : undefined}>{word}</li>)}
    </ol>
  );
}

const readStep: Record<FileState, [string, Standing]> = {
  'waiting': ['to be read', 'open'], 'reading': ['reading', 'now'], 'read': ['read', 'done'],
  'needs answer': ['asks you', 'asks'], 'refused': ['refused', 'stuck'],
};

/** Sending, stored, read: where a file that the server has really is. */
export const StoredTrack = ({ state }: { state: FileState }) => <Track steps={[['sent', 'done'], ['stored', 'done'], readStep[state]]} />;

/** The same for a file that this browser is sending. */
export function SendingTrack({ upload }: { upload: LocalUpload }) {
  const percent = `${formatNumber(upload.sentShare * 100, 0, readerLocale())}\u2009%`;
  if (upload.phase === 'stored') return <Track steps={[['sent', 'done'], ['stored', 'done'], ['to be read', 'open']]} />;
  if (upload.phase === 'not sent') return <Track steps={[['not sent', 'stuck'], ['stored ', 'open'], ['read', 'open']]} />;
  const first: [string, Standing] = upload.phase === 'queued' ? ['in line', 'open'] : [`sending ${percent}`, 'now'];
  return <Track steps={[first, upload.sentShare === 1 ? ['storing', 'now'] : ['stored', 'open'], ['read', 'open']]} />;
}
