import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { useId, useRef, useState, type DragEvent, type ReactElement, type ReactNode } from 'react';

interface FileDropProps {
  label: string;
  /** As the `accept` attribute takes it: `.csv,text/csv`. */
  accept: string;
  onFile: (file: File) => void;
  /** Largest size in bytes; a larger file is refused before anything is sent. */
  largest: number;
  hint?: ReactNode;
  chosen?: File;
}

const Zone = styled('div')(({ theme }) => ({
  display: 'flex',
  flexWrap: 'wrap',
  alignItems: 'center',
  gap: '8px 14px',
  padding: '18px 20px',
  border: `1px dashed ${theme.vars.palette.tone.edge}`,
  borderRadius: 3,
  background: theme.vars.palette.tone.sheet,
  '&[data-over]': {
    borderStyle: 'solid',
    borderColor: theme.vars.palette.tone.board,
    background: theme.vars.palette.tone.boardSoft,
  },
  '& input': { position: 'absolute', width: 1, height: 1, overflow: 'hidden', clipPath: 'inset(50%)' },
  '& small': { flexBasis: '100%', fontSize: '0.8125rem', color: theme.vars.palette.tone.inkSoft },
  '& small[role]': { color: theme.vars.palette.tone.hot },
}));

const megabyte = 1_000_000;

function fits(file: File, accept: string, largest: number): string | undefined {
  const kinds = accept.split(',').map((kind) => kind.trim().toLowerCase());
  const known = kinds.some((kind) =>
    kind.startsWith('.') ? file.name.toLowerCase().endsWith(kind) : file.type === kind,
  );
  if (!known) return `${file.name} is not a file of this kind (${accept}).`;
  if (file.size === 0) return `${file.name} is empty.`;
  if (file.size > largest)
    return `${file.name} has ${(file.size / megabyte).toFixed(1)} MB; at most ${largest / megabyte} MB are taken.`;
  return undefined;
}

/** Takes one file, dropped or chosen. */
export function FileDrop({ label, accept, onFile, largest, hint, chosen }: FileDropProps): ReactElement {
  const [over, setOver] = useState(false);
  const [fault, setFault] = useState<string>();
  const input = useRef<HTMLInputElement>(null);
  const [inputId, noteId] = [useId(), useId()];
  const take = (file: File | undefined): void => {
    if (!file) return;
    const refusal = fits(file, accept, largest);
    setFault(refusal);
    if (!refusal) onFile(file);
  };
  const drop = (event: DragEvent): void => {
    event.preventDefault();
    setOver(false);
    take(event.dataTransfer.files[0]);
  };
  return (
    <Zone
      data-over={over ? '' : undefined}
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={drop}
    >
      <input
        ref={input}
        id={inputId}
        type="file"
        accept={accept}
        tabIndex={-1}
        aria-label={label}
        onChange={(event) => {
          take(event.target.files?.[0]);
          event.target.value = '';
        }}
      />
      <Button onClick={() => input.current?.click()} aria-describedby={noteId}>
        {chosen ? 'Choose another file' : label}
      </Button>
      <span>{chosen ? chosen.name : 'or drop it here'}</span>
      <small id={noteId} role={fault ? 'alert' : undefined}>
        {fault ?? hint}
      </small>
    </Zone>
  );
}
