import Button from '@mui/material/Button';
import OutlinedInput from '@mui/material/OutlinedInput';
import { styled } from '@mui/material/styles';
import { useEffect, useId, useRef, useState, type FormEvent, type ReactElement } from 'react';
import { useIdempotencyKey } from '../../../api/idempotency';
import { Tag } from '../../../components/tag/tag';
import { formatQuantity } from '../../../lib/format-quantity';
import { parseDecimal } from '../../../lib/parse-number';
import { sentenceOf } from '../../../lib/problem';
import type { IssueLine, PickRow } from '../api/bench';

const Row = styled('li')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    borderBottom: `1px solid ${tone.line}`,
    padding: '10px 0 10px 10px',
    borderLeft: '4px solid transparent',
    '&[data-in-hand]': { borderLeftColor: tone.board, background: tone.boardSoft },
    '& form': { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '8px 16px' },
    '& .what': { flex: '1 1 220px', minWidth: 0 },
    '& .quiet': { color: tone.inkSoft, fontSize: '0.8125rem' },
    '& label': { display: 'inline-flex', alignItems: 'center', gap: 6, fontSize: '0.8125rem', color: tone.inkSoft },
    '& .fault': { flexBasis: '100%', color: tone.hot, margin: 0 },
    '& .MuiButton-root': { minHeight: 48 },
    '& .MuiInputBase-root': { minHeight: 48 },
  };
});

interface PickLineProps {
  line: PickRow;
  /** The act: Take, Give back. */
  verb: string;
  inHand: boolean;
  /** Another lot, bin or approved part may be named. */
  changeable?: boolean;
  onDo: (line: IssueLine, key: string) => Promise<unknown>;
}

/** One line of a pick list: where, what, how many, and the act. */
export function PickLine({ line, verb, inHand, changeable = false, onDo }: PickLineProps): ReactElement {
  const [typed, setTyped] = useState<string>();
  const [other, setOther] = useState<{ part: string; lot: string; bin: string }>();
  const [fault, setFault] = useState<string>();
  const [busy, setBusy] = useState(false);
  const { keyFor, done } = useIdempotencyKey();
  const field = useRef<HTMLInputElement>(null);
  const id = useId();
  useEffect(() => {
    if (!inHand) return;
    field.current?.focus();
    field.current?.select();
  }, [inHand]);
  const quantity = typed ?? line.quantity;
  const send = async (event: FormEvent): Promise<void> => {
    event.preventDefault();
    const body: IssueLine = {
      path: line.path,
      part: (other?.part ?? line.part.code).trim(),
      lot: (other ? other.lot.trim() : line.lot) || null,
      bin: (other?.bin ?? line.bin).trim(),
      quantity: parseDecimal(quantity) ?? quantity,
    };
    setBusy(true);
    setFault(undefined);
    try {
      await onDo(body, keyFor(body));
      done();
      setTyped(undefined);
      setOther(undefined);
    } catch (error) {
      setFault(sentenceOf(error).sentence);
    } finally {
      setBusy(false);
    }
  };
  const name = `${line.part.code}${line.lot ? `, lot ${line.lot}` : ''}`;
  const rename = (part: Partial<{ part: string; lot: string; bin: string }>): void =>
    setOther({ part: line.part.code, lot: line.lot ?? '', bin: line.bin, ...other, ...part });
  return (
    <Row data-in-hand={inHand ? '' : undefined} aria-current={inHand ? 'true' : undefined}>
      <form onSubmit={(event) => void send(event)} aria-label={`${verb} ${name}`}>
        <Tag kind="bin" code={line.bin} />
        <Tag kind="part" code={line.part.code} story={line.part.name} />
        {line.lot ? <Tag kind="lot" code={line.lot} /> : null}
        <div className="what">
          {line.part.name}
          <div className="quiet">
            {[line.standsInFor ? `stands in for ${line.standsInFor}` : '', line.marks ?? '', `place ${line.path}`]
              .filter(Boolean)
              .join(' · ')}
          </div>
        </div>
        <label htmlFor={id}>
          Quantity
          <OutlinedInput
            id={id}
            inputRef={field}
            value={quantity}
            onChange={({ target }) => setTyped(target.value)}
            endAdornment={line.part.measure}
            inputProps={{ inputMode: 'decimal', 'aria-label': `Quantity of ${name}` }}
            sx={{ width: 150 }}
          />
        </label>
        <Button
          type="submit"
          variant="contained"
          disabled={busy}
          aria-label={`${verb} ${formatQuantity(quantity)} ${name}`}
        >
          {verb}
        </Button>
        {changeable && !other ? (
          <Button variant="text" onClick={() => rename({})} aria-label={`Another lot for ${name}`}>
            Another lot
          </Button>
        ) : null}
        {other ? (
          <>
            <label htmlFor={`${id}-part`}>
              Part
              <OutlinedInput
                id={`${id}-part`}
                value={other.part}
                onChange={({ target }) => rename({ part: target.value })}
                sx={{ width: 160 }}
              />
            </label>
            <label htmlFor={`${id}-lot`}>
              Lot
              <OutlinedInput
                id={`${id}-lot`}
                value={other.lot}
                onChange={({ target }) => rename({ lot: target.value })}
                sx={{ width: 150 }}
              />
            </label>
            <label htmlFor={`${id}-bin`}>
              Bin
              <OutlinedInput
                id={`${id}-bin`}
                value={other.bin}
                onChange={({ target }) => rename({ bin: target.value })}
                sx={{ width: 120 }}
              />
            </label>
          </>
        ) : null}
        {fault ? (
          <p className="fault" role="alert">
            ✕ {fault}
          </p>
        ) : null}
      </form>
    </Row>
  );
}
