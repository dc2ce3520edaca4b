import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import { useDeferredValue, useState, type ReactElement, type ReactNode } from 'react';
import { useFormContext, useFormState, useWatch } from 'react-hook-form';
import { useFieldId } from '../../../../components/form/field-names';
import { componentsQuery, type BillPart } from '../../api/bills';

const Cell = styled('div')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    minWidth: 0,
    '& input, & select, & textarea': {
      font: 'inherit',
      width: '100%',
      boxSizing: 'border-box',
      padding: '5px 7px',
      color: tone.ink,
      background: tone.sheet,
      border: `1px solid ${tone.edge}`,
      borderRadius: 3,
    },
    '& textarea': { resize: 'vertical', minHeight: 32, fieldSizing: 'content' },
    '& [data-figure]': { textAlign: 'right', fontVariantNumeric: 'tabular-nums' },
    '& [data-code]': { fontFamily: theme.typography.mono.fontFamily, textTransform: 'uppercase' },
    '& :focus-visible': { outline: `2px solid ${tone.board}`, outlineOffset: 0 },
    '& [aria-invalid="true"]': { borderColor: tone.hot, borderWidth: 2, padding: '4px 6px' },
    '& :disabled': { background: tone.canvas, borderColor: tone.line, color: tone.inkSoft },
    '& small': { display: 'block', fontSize: '0.8125rem', color: tone.inkSoft, marginTop: 2 },
    '& small[data-fault]': { color: tone.hot },
  };
});

export interface CellProps {
  /** The field's name: `lines.3.part`. */
  name: string;
  /** Names the field for those who can't see its column: `Part, line 4`. */
  label: string;
  /** For moving with the keyboard. */
  row: number;
  column: string;
  figure?: boolean;
  disabled?: boolean;
  longest?: number;
}

/** What every cell of a table to type in has: a name without a visible label, and its fault beneath it. */
function useCell({ name, label, row, column }: CellProps) {
  const id = useFieldId(name);
  const { control, getFieldState } = useFormContext();
  const state = useFormState({ control, name });
  const fault = getFieldState(name, state).error?.message;
  return {
    fault,
    note: fault ? (
      <small id={`${id}-note`} data-fault="">
        ✕ {fault}
      </small>
    ) : null,
    attributes: {
      id,
      'aria-label': label,
      'aria-invalid': fault ? true : undefined,
      'aria-describedby': fault ? `${id}-note` : undefined,
      'data-row': row,
      'data-column': column,
    },
  };
}

export function TextCell(props: CellProps): ReactElement {
  const { register } = useFormContext();
  const cell = useCell(props);
  return (
    <Cell>
      <input
        {...register(props.name)}
        {...cell.attributes}
        autoComplete="off"
        inputMode={props.figure ? 'decimal' : undefined}
        data-figure={props.figure ? '' : undefined}
        disabled={props.disabled}
        maxLength={props.longest}
      />
      {cell.note}
    </Cell>
  );
}

export function CodesCell(props: CellProps): ReactElement {
  const { register } = useFormContext();
  const cell = useCell(props);
  return (
    <Cell>
      <input {...register(props.name)} {...cell.attributes} autoComplete="off" spellCheck={false} data-code="" />
      {cell.note}
    </Cell>
  );
}

export function LongTextCell(props: CellProps): ReactElement {
  const { register } = useFormContext();
  const cell = useCell(props);
  return (
    <Cell>
      <textarea {...register(props.name)} {...cell.attributes} rows={1} maxLength={props.longest} />
      {cell.note}
    </Cell>
  );
}

interface ChoiceCellProps extends CellProps {
  children: ReactNode;
}

export function ChoiceCell({ children, ...props }: ChoiceCellProps): ReactElement {
  const { register } = useFormContext();
  const cell = useCell(props);
  return (
    <Cell>
      <select {...register(props.name)} {...cell.attributes}>
        {children}
      </select>
      {cell.note}
    </Cell>
  );
}

interface PartCellProps extends CellProps {
  /** Parts that are known already, by their codes. */
  known: ReadonlyMap<string, BillPart>;
}

/** A part by its code: typed, scanned or chosen from what the letters find; its name stands beneath. */
export function PartCell({ known, ...props }: PartCellProps): ReactElement {
  const { register } = useFormContext();
  const cell = useCell(props);
  const value: unknown = useWatch({ name: props.name });
  const typed = typeof value === 'string' ? value.trim().toUpperCase() : '';
  const [open, setOpen] = useState(false);
  const asked = useDeferredValue(typed);
  const found = useQuery({ ...componentsQuery(asked), enabled: open && asked.length > 0 }).data?.items ?? [];
  const name = known.get(typed)?.name ?? found.find(({ code }) => code === typed)?.name;
  const listId = `${cell.attributes.id}-parts`;
  const { onBlur, ...field } = register(props.name);
  return (
    <Cell>
      <input
        {...field}
        {...cell.attributes}
        onFocus={() => setOpen(true)}
        onBlur={(event) => {
          setOpen(false);
          void onBlur(event);
        }}
        list={listId}
        autoComplete="off"
        spellCheck={false}
        data-code=""
      />
      <datalist id={listId}>
        {found.map((part) => (
          <option key={part.code} value={part.code}>
            {part.name}
          </option>
        ))}
      </datalist>
      {cell.note ?? (name ? <small>{name}</small> : null)}
    </Cell>
  );
}
