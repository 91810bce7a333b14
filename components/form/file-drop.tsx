import { useId, useRef, useState, type ReactNode } from 'react';
import FileUp from 'lucide-react-native/icons/file-up';
import { color, face } from '@/components/theme';
import { Button, type ButtonKind } from '@/components/ui';

export interface FileDropProps {
  /** "Upload an alignment of one family". */
  title: ReactNode;
  /** What may be given, and the limit. */
  hint?: ReactNode;
  /** Words of the button. */
  action?: string;
  /** Endings the chooser offers, `.afa,.fasta`. Other files are not refused here: reading them says what is wrong. */
  accept?: string;
  onFile: (file: File) => void;
  error?: string;
  busyText?: string;
  offReason?: string;
  /** Plain where the page's one primary button is another. */
  buttonKind?: ButtonKind;
  /** Beside the button, for example the sample. */
  more?: ReactNode;
}

/** A file chosen or dropped, one at a time. */
export function FileDrop(props: FileDropProps) {
  const {
    title,
    hint,
    action = 'Choose a file',
    accept,
    onFile,
    error,
    busyText,
    offReason,
    more,
    buttonKind = 'primary',
  } = props;
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const resting = busyText !== undefined || offReason !== undefined;
  const take = (files: FileList | null) => {
    const file = files?.[0];
    if (file && !resting) onFile(file);
  };
  return (
    <div
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={(event) => {
        event.preventDefault();
        setOver(false);
        take(event.dataTransfer.files);
      }}
      style={{
        display: 'grid',
        gap: 12,
        justifyItems: 'start',
        padding: 20,
        border: `1.5px dashed ${over ? color.accent : color.lineControl}`,
        borderRadius: 4,
        background: over ? color.accentSoft : color.raised,
        color: color.ink,
        font: `400 14px/20px ${face.text}`,
      }}
    >
      <label htmlFor={id} style={{ font: `600 16px/24px ${face.text}` }}>
        {title}
      </label>
      {hint ? (
        <p id={`${id}-hint`} style={{ color: color.inkSoft }}>
          {hint}
        </p>
      ) : null}
      <input
        ref={input}
        id={id}
        type="file"
        accept={accept}
        className="sr-only"
        tabIndex={-1}
        aria-describedby={hint ? `${id}-hint` : undefined}
        onChange={(event) => {
          take(event.target.files);
          // So that choosing the same, mended file again is a change.
          event.target.value = '';
        }}
      />
      <div style={{ display: 'flex', flexWrap: 'wrap', gap: 8, alignItems: 'center' }}>
        <Button
          kind={buttonKind}
          icon={FileUp}
          busyText={busyText}
          offReason={offReason}
          onPress={() => input.current?.click()}
        >
          {action}
        </Button>
        {more}
      </div>
      <p style={{ color: color.inkSoft }}>or drop it here</p>
      {error ? (
        <p role="alert" style={{ color: color.danger, fontWeight: 600 }}>
          {error}
        </p>
      ) : null}
    </div>
  );
}
