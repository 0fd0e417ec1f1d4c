import { useEffect, useId, useRef, type ReactNode } from 'react';
import { Button } from './Button';

interface DialogProps { title: string; onClose: () => void; children: ReactNode; confirm?: { word: string; onConfirm: () => void; grave?: boolean } }

/** The browser's own dialog: keeps the focus inside and closes by Esc. */
export function Dialog({ title, onClose, children, confirm }: DialogProps) {
  const place = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = place.current;
    dialog?.showModal();
    return () => dialog?.close();
  }, []);
  return (
    <dialog ref={place} aria-labelledby={titleId} onCancel={(event) => { event.preventDefault(); onClose(); }} className="m-auto w-[min(32rem,92vw)] border-2 border-ink bg-sheet p-6 text-ink backdrop:bg-[rgb(22_20_18/0.55)]">
      <h2 id={titleId} className="mb-3 text-lg">{title}</h2>
      {children}
      <div className="mt-5 flex flex-wrap gap-2">
        {confirm && <Button kind={confirm.grave ? 'grave' : 'main'} onClick={confirm.onConfirm}>{confirm.word}</Button>}
        <Button onClick={onClose}>{confirm ? 'Leave it' : 'Close'}</Button>
      </div>
    </dialog>
  );
}
