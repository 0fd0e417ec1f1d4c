import { bringFileBack, getFile, readFileAgain, setFileAside } from '@leeside/contracts/files';
import { listCurves } from '@leeside/contracts/curves';
import { getSession, type Session } from '@leeside/contracts/sessions';
import { getToday } from '@leeside/contracts/today';
import { listTraces } from '@leeside/contracts/traces';
import { Link } from 'react-router-dom';
import { useApiChange } from '../../../api-client/use-api-change';
import { useApiQuery } from '../../../api-client/use-api-query';
import { useMay } from '../../../app/session-context';
import { Answered } from '../../../components/Answered';
import { Button } from '../../../components/Button';
import { FileProblem } from '../../../components/FileProblem';
import { FileQuestions } from '../../../components/FileQuestions';
import { LoadingLines } from '../../../components/LoadingLines';
import { StateMark } from '../../../components/StateMark';
import { SendingTrack, StoredTrack } from './PhaseTrack';
import { uploadStore, type LocalUpload } from './upload-store';

type TrayFile = Session['files'][number];
const touched = [getSession, getFile, listTraces, listCurves, getToday];

/** What a file that came to no good says and asks. */
function FileTrouble({ fileId }: { fileId: string }) {
  const file = useApiQuery(getFile, { params: { id: fileId } });
  const mayEdit = useMay('file.edit');
  const again = useApiChange(readFileAgain, touched);
  return (
    <Answered query={file} what="the file" loading={<LoadingLines what="the file" lines={1} />}>
      {(found) => (
        <div className="mt-2 space-y-2">
          {found.problem && <FileProblem problem={found.problem} />}
          {found.questions && found.questions.length > 0 && <FileQuestions file={found} mayAnswer={mayEdit} />}
          {found.problem && mayEdit && <Button kind="quiet" disabled={again.isPending} onClick={() => again.mutate({ params: { id: fileId } })}>Read it again</Button>}
        </div>
      )}
    </Answered>
  );
}

export function StoredRow({ file }: { file: TrayFile }) {
  const mayEdit = useMay('file.edit');
  const aside = useApiChange(setFileAside, touched);
  const back = useApiChange(bringFileBack, touched);
  const isAside = file.setAsideAt !== null;
  const hasTrouble = !isAside && (file.state === 'refused' || file.state === 'needs answer');
  return (
    <li className="border-b border-rule py-2.5" data-state={file.state}>
      <div className="flex flex-wrap items-center gap-x-5 gap-y-1">
        <Link to={`/files/${file.id}`} className={`min-w-56 flex-1 wrap-anywhere ${isAside ? 'text-faded line-through' : ''}`}>{file.name}</Link>
        {isAside ? <StateMark state="set aside" /> : <StoredTrack state={file.state} />}
        {mayEdit && (isAside
          ? <Button kind="quiet" disabled={back.isPending} onClick={() => back.mutate({ params: { id: file.id } })}>Bring back<span className="sr-only"> {file.name}</span></Button>
          : <Button kind="quiet" disabled={aside.isPending} onClick={() => aside.mutate({ params: { id: file.id } })}>Set aside<span className="sr-only"> {file.name}</span></Button>)}
      </div>
      {hasTrouble && <FileTrouble fileId={file.id} />}
    </li>
  );
}

export function SendingRow({ upload }: { upload: LocalUpload }) {
  const ended = upload.phase === 'not sent' || upload.duplicate;
  return (
    <li className="border-b border-rule py-2.5">
      <div className="flex flex-wrap items-center gap-x-5 gap-y-1">
        <span className="min-w-56 flex-1 wrap-anywhere">{upload.name}</span>
        <SendingTrack upload={upload} />
        {upload.again && <Button kind="quiet" onClick={upload.again}>Try again</Button>}
        {ended && <Button kind="quiet" onClick={() => uploadStore.drop([upload.key])}>Take off the list</Button>}
      </div>
      {upload.trouble && <p className="mt-1 text-sm text-plum">{upload.trouble}</p>}
      {upload.duplicate && <p className="mt-1 text-sm text-faded">The same bytes are in this session already; the first file stands for both.</p>}
    </li>
  );
}
