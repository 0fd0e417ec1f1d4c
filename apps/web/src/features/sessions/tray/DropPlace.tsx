import { useId, useState, type DragEvent } from 'react';

/** Where files are dropped or chosen. */
export function DropPlace({ onFiles }: { onFiles: (files: File[]) => void }) {
  const [over, setOver] = useState(false);
  const id = useId();
  const drop = (event: DragEvent): void => {
    event.preventDefault();
    setOver(false);
    onFiles([...event.dataTransfer.files]);
  };
  return (
    <div
      onDragOver={(event) => { event.preventDefault(); setOver(true); }} onDragLeave={() => setOver(false)} onDrop={drop}
      className={`relative border-2 border-dashed px-5 py-6 ${over ? 'border-copper bg-sheet' : 'border-edge'}`}
    >
      <label htmlFor={id} className="inline-flex min-h-10 items-center gap-1 font-semibold text-copper underline underline-offset-4 has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-copper">
        <input
          id={id} type="file" multiple className="sr-only" data-testid="tray-input"
          onChange={(event) => { onFiles([...(event.target.files ?? [])]); event.target.value = ''; }}
        />
        Choose sweep files
      </label>
      <span> or drop them here.</span>
      <p className="text-sm text-faded">As the analyzer wrote them: CSV, text or Touchstone, up to 64 MiB each, 200 at a time. The bytes are kept as they are.</p>
    </div>
  );
}
