import { getSession, type Session } from '@leeside/contracts/sessions';
import { listTraces } from '@leeside/contracts/traces';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { UploadFieldTexts } from '../../../api-client/upload-files';
import { useMay } from '../../../app/session-context';
import { EmptyState } from '../../../components/EmptyState';
import { Passage } from '../../../components/Passage';
import { Remark, Remarks } from '../../../components/Remarks';
import { BatchFields } from './BatchFields';
import { DropPlace } from './DropPlace';
import { SendingRow, StoredRow } from './TrayRows';
import { progressInWords } from './progress-in-words';
import { startUpload } from './upload-store';
import { useUploads } from './use-uploads';

/** Where files come in; each shows where it really is. */
export function Tray({ session }: { session: Session }) {
  const [fields, setFields] = useState<UploadFieldTexts>({});
  const client = useQueryClient();
  const mayUpload = useMay('file.upload');
  const uploads = useUploads(session.id, session.files.map(({ id }) => id));
  const send = (files: File[]): void => {
    void startUpload(session.id, files, fields).then(() =>
      Promise.all([getSession, listTraces].map(({ name }) => client.invalidateQueries({ queryKey: [name] }))));
  };
  const remarks = (
    <Remarks about="the tray">
      <Remark>A name such as <code>reference-opening.csv</code> or <code>enclosed-P7.csv</code> says what the sweep is. What was guessed is marked below until you confirm it.</Remark>
      <Remark>Every file is kept byte for byte with its SHA-256; setting one aside deletes nothing.</Remark>
    </Remarks>
  );
  return (
    <Passage id="tray" title="Tray" count={session.files.length} remarks={remarks}>
      {mayUpload && <div className="mb-4 space-y-3"><BatchFields fields={fields} onFields={setFields} /><DropPlace onFiles={send} /></div>}
      <p className="flex gap-x-3 text-sm">
        <span role="status" className="text-faded">{progressInWords(session.progress, uploads.filter(({ phase }) => phase === 'sending' || phase === 'queued').length)}</span>
        {session.progress.curvesReady > 0 && <a href="#curves">To the curves</a>}
      </p>
      {session.files.length + uploads.length === 0 && !mayUpload && <EmptyState title="No file yet">An engineer brings the sweeps of this session in here.</EmptyState>}
      <ul className="list-none">
        {uploads.map((upload) => <SendingRow key={upload.key} upload={upload} />)}
        {session.files.map((file) => <StoredRow key={file.id} file={file} />)}
      </ul>
    </Passage>
  );
}
