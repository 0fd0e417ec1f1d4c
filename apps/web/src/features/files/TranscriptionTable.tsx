import type { FileBody } from '@leeside/contracts/files';
import { readerLocale, shownUnit } from '../../components/reader-locale';
import { Cell, HeadCell, Table } from '../../components/Table';
import { otherDecisions, transcriptionRows } from './transcription-rows';

export function TranscriptionTable({ transcription }: { transcription: NonNullable<FileBody['transcription']> }) {
  const rows = transcriptionRows(transcription, readerLocale());
  return (
    <Table caption="How the file was read">
      <thead><tr><HeadCell>What</HeadCell><HeadCell>Taken as</HeadCell><HeadCell>Decided by</HeadCell></tr></thead>
      <tbody>
        {rows.map(({ what, found, decidedBy }) => (
          <tr key={what}><Cell>{what}</Cell><Cell><span className="figure">{shownUnit(found)}</span></Cell><Cell className="text-faded">{decidedBy}</Cell></tr>
        ))}
        {otherDecisions(transcription).map(([what, how]) => <tr key={what}><Cell>{what}</Cell><Cell /><Cell className="text-faded">{how}</Cell></tr>)}
      </tbody>
    </Table>
  );
}
