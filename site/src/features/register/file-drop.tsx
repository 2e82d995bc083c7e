import { type ChangeEvent, type DragEvent, useState } from 'react';

interface FileDropProps {
  busy: boolean;
  onFile: (file: File) => void;
}

/** A place to drop a certificate's PDF, or to choose it by keyboard or thumb. */
export function FileDrop({ busy, onFile }: FileDropProps) {
  const [isOver, setIsOver] = useState(false);
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setIsOver(false);
    const file = event.dataTransfer.files[0];
    if (file) onFile(file);
  };
  const choose = (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.target.files?.[0];
    if (file) onFile(file);
    // The same file may be chosen again.
    event.target.value = '';
  };
  return (
    // A drop is the pointer's way; the input inside is the keyboard's and the thumb's.
    <div
      className={isOver ? 'file-drop over' : 'file-drop'}
      onDragOver={(event) => {
        event.preventDefault();
        setIsOver(true);
      }}
      onDragLeave={() => setIsOver(false)}
      onDrop={drop}
    >
      <input
        type="file"
        accept="application/pdf,.pdf"
        disabled={busy}
        onChange={choose}
        aria-label="The certificate’s PDF"
        aria-describedby="file-stays"
      />
      <span aria-hidden="true">
        <b>{busy ? 'Looking at the file' : 'Choose the PDF, or drop it here'}</b>
        <small>It is looked at in your browser and stays there.</small>
      </span>
      <span id="file-stays" className="visually-hidden">
        It is looked at in your browser and stays there.
      </span>
    </div>
  );
}
