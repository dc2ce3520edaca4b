import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import TextField from '@mui/material/TextField';
import { useRef, useState, type FormEvent, type ReactElement } from 'react';
import { Flag } from '../../../components/flag';
import { Sentence } from '../../../components/sentence';
import { sentenceOf } from '../../../lib/problem';
import { useScan } from '../../../lib/use-scan';
import { useScanInto } from '../api/counter';

const Desk = styled('form')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 1fr) 9rem auto',
  gap: 12,
  alignItems: 'end',
  padding: 16,
  border: `1px solid ${theme.vars.palette.tone.line}`,
  borderRadius: 3,
  background: theme.vars.palette.tone.sheet,
  '& input': { fontSize: '1.25rem', minHeight: 32 },
  '& button': { minHeight: 48 },
  '& .said': { gridColumn: '1 / -1', minHeight: '2.5rem', fontSize: '1.125rem', margin: 0 },
  [theme.breakpoints.down('sm')]: { gridTemplateColumns: '1fr' },
}));

type Said = { ok: boolean; text: string } | undefined;

/** Takes what is scanned or typed, and says in a sentence what came of it. Works by scanner and by keyboard alone. */
export function ScanField({ parcel }: { parcel: string }): ReactElement {
  const scan = useScanInto(parcel);
  const field = useRef<HTMLInputElement>(null);
  const [code, setCode] = useState('');
  const [quantity, setQuantity] = useState('');
  const [bin, setBin] = useState<string>();
  const [said, setSaid] = useState<Said>();
  const take = async (text: string): Promise<void> => {
    try {
      const amount = quantity.trim().replace(',', '.');
      const answer = await scan.mutateAsync({
        code: text,
        ...(bin === undefined ? {} : { bin }),
        ...(amount === '' ? {} : { quantity: amount }),
      });
      setBin(answer.bin ?? undefined);
      setSaid({ ok: true, text: answer.sentence });
      setCode('');
      setQuantity('');
    } catch (error) {
      setSaid({ ok: false, text: sentenceOf(error).sentence });
    }
    field.current?.focus();
    field.current?.select();
  };
  useScan((scanned) => {
    void take(scanned);
    return true;
  });
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    if (code.trim() !== '') void take(code.trim());
  };
  return (
    <Desk onSubmit={submit} aria-label="Put something in">
      <TextField
        label="Scan a unit, a lot or a bin"
        value={code}
        onChange={(event) => setCode(event.target.value)}
        inputRef={field}
        autoComplete="off"
        slotProps={{ htmlInput: { maxLength: 200 } }}
      />
      <TextField
        label="How many"
        value={quantity}
        onChange={(event) => setQuantity(event.target.value)}
        placeholder="all missing"
        slotProps={{ htmlInput: { inputMode: 'decimal', maxLength: 20 }, inputLabel: { shrink: true } }}
      />
      <Button type="submit" variant="contained" loading={scan.isPending}>
        Put it in
      </Button>
      <output className="said">
        {said ? (
          <>
            <Flag tone={said.ok ? 'sound' : 'hot'}>{said.ok ? 'taken' : 'refused'}</Flag> <Sentence text={said.text} />
          </>
        ) : (
          'Nothing scanned yet.'
        )}
        {bin ? ` From bin ${bin}.` : ''}
      </output>
    </Desk>
  );
}
