import { useState } from 'react';
import { Dialog } from '../../../components/Dialog';
import { TextField } from '../../../components/Field';

interface SetAsideDialogProps { name: string; onClose: () => void; onSetAside: (reason: string) => void }

/** A trace is set aside with a reason, and can be brought back. */
export function SetAsideDialog({ name, onClose, onSetAside }: SetAsideDialogProps) {
  const [reason, setReason] = useState('');
  const [asked, setAsked] = useState(false);
  const confirm = (): void => {
    setAsked(true);
    if (reason.trim()) onSetAside(reason.trim());
  };
  return (
    <Dialog title={`Set ${name} aside`} onClose={onClose} confirm={{ word: 'Set aside', onConfirm: confirm }}>
      <p className="mb-4 text-sm text-faded">It stays in the session and out of every curve until it is brought back.</p>
      <TextField id="set-aside-reason" label="Why" value={reason} maxLength={500} error={asked && !reason.trim() ? 'A reason is missing.' : undefined} onChange={(event) => setReason(event.target.value)} />
    </Dialog>
  );
}
