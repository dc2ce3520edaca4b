import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';
import { capital } from '../../../lib/number-words';

const Rows = styled('div')(({ theme }) => ({
  display: 'grid',
  gap: 12,
  '& > .row': {
    display: 'flex',
    flexWrap: 'wrap',
    gap: 12,
    alignItems: 'flex-start',
    paddingBottom: 12,
    borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
  },
  '& > .row > .act': { marginTop: 27 },
}));

interface RowListProps {
  legend: string;
  /** The fields of each row, under its key in the field array. */
  rows: readonly { key: string; fields: ReactNode }[];
  /** Names one row for its button: `line 2`. */
  rowName: (index: number) => string;
  addLabel: string;
  onAdd: () => void;
  onRemove: (index: number) => void;
  /** What stands there while there is no row. */
  none?: string;
  fewest?: number;
}

/** Lines of one form, each with its fields side by side: added below, taken out one by one. */
export function RowList(props: RowListProps): ReactElement {
  const { legend, rows, rowName, addLabel, onAdd, onRemove, none, fewest = 0 } = props;
  return (
    <fieldset>
      <legend>{legend}</legend>
      <Rows>
        {rows.length === 0 && none ? <p style={{ margin: 0 }}>{none}</p> : null}
        {rows.map(({ key, fields }, index) => (
          // oxlint-disable-next-line jsx-a11y/prefer-tag-over-role -- a fieldset in each row would draw its own frame
          <div key={key} className="row" role="group" aria-label={capital(rowName(index))}>
            {fields}
            {rows.length > fewest ? (
              <div className="act">
                <Button
                  size="small"
                  variant="text"
                  onClick={() => onRemove(index)}
                  aria-label={`Take out ${rowName(index)}`}
                >
                  Take out
                </Button>
              </div>
            ) : null}
          </div>
        ))}
        <div>
          <Button size="small" onClick={onAdd}>
            {addLabel}
          </Button>
        </div>
      </Rows>
    </fieldset>
  );
}
