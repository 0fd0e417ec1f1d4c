import { listCurves } from '@leeside/contracts/curves';
import { bringFileBack, getFile, getRawFile, readFileAgain, setFileAside, type FileBody } from '@leeside/contracts/files';
import { getSession } from '@leeside/contracts/sessions';
import { formatNumber } from '@leeside/units/format-quantity';
import { Link, useParams } from 'react-router-dom';
import { endpointUrl } from '../../api-client/endpoint-url';
import { useApiChange } from '../../api-client/use-api-change';
import { useApiQuery } from '../../api-client/use-api-query';
import { useMay } from '../../app/session-context';
import { Answered } from '../../components/Answered';
import { Button } from '../../components/Button';
import { FileProblem } from '../../components/FileProblem';
import { FileQuestions } from '../../components/FileQuestions';
import { Moment } from '../../components/Moment';
import { PageHead } from '../../components/PageHead';
import { Passage } from '../../components/Passage';
import { readerLocale } from '../../components/reader-locale';
import { DoubtRemarks, Remark, Remarks } from '../../components/Remarks';
import { StateMark } from '../../components/StateMark';
import { TranscriptionTable } from './TranscriptionTable';

const readingPollMs = 1_500;
const touched = [getFile, getSession, listCurves];

function FileActions({ file }: { file: FileBody }) {
  const again = useApiChange(readFileAgain, touched);
  const aside = useApiChange(setFileAside, touched);
  const back = useApiChange(bringFileBack, touched);
  const input = { params: { id: file.id } };
  if (file.setAsideAt) return <Button onClick={() => back.mutate(input)}>Bring back</Button>;
  return (
    <>
      {(file.state === 'refused' || file.state === 'read') && <Button onClick={() => again.mutate(input)} disabled={again.isPending}>Read it again</Button>}
      <Button onClick={() => aside.mutate(input)}>Set aside</Button>
    </>
  );
}

function FileHead({ file }: { file: FileBody }) {
  const mayEdit = useMay('file.edit');
  const raw = endpointUrl(getRawFile, { params: { id: file.id } });
  return (
    <PageHead title={file.name} folio={<>File of <Link to={`/sessions/${file.sessionId}`}>its session</Link>, brought in <Moment at={file.uploadedAt} /></>} action={mayEdit && <FileActions file={file} />}>
      <p className="flex flex-wrap items-center gap-x-4 gap-y-1 text-sm">
        <StateMark state={file.setAsideAt ? 'set aside' : file.state} />
        <span><span className="figure">{formatNumber(file.bytes, 0, readerLocale())}</span> bytes</span>
        <a href={raw} download={file.name}>The bytes as they came</a>
      </p>
      <p className="mt-1 text-xs text-faded">SHA-256 <code className="break-all">{file.sha256}</code></p>
    </PageHead>
  );
}

function Reading({ file }: { file: FileBody }) {
  const mayEdit = useMay('file.edit');
  const { transcription } = file;
  return (
    <>
      {file.problem && <Passage title="Why it was refused"><FileProblem problem={file.problem} /></Passage>}
      {file.questions && file.questions.length > 0 && (
        <Passage title="What it leaves open" count={file.questions.length} remarks={<Remarks about="the questions"><Remark>Nothing is guessed where a guess could change a number.</Remark></Remarks>}>
          <FileQuestions file={file} mayAnswer={mayEdit} />
        </Passage>
      )}
      {transcription && (
        <Passage title="How it was read" remarks={<Remarks about="the reading"><DoubtRemarks doubts={file.doubts} /></Remarks>}>
          <TranscriptionTable transcription={transcription} />
        </Passage>
      )}
      {!transcription && !file.problem && <p role="status">It is waiting to be read.</p>}
    </>
  );
}

export function FilePage() {
  const { fileId = '' } = useParams();
  const file = useApiQuery(getFile, { params: { id: fileId } }, {
    refetchInterval: (query) => (['waiting', 'reading'].includes(query.state.data?.state ?? '') ? readingPollMs : false),
  });
  return <Answered query={file} what="the file">{(found) => <><FileHead file={found} /><Reading file={found} /></>}</Answered>;
}
