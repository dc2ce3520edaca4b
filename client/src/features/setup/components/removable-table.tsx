import Button from '@mui/material/Button';
import { useState, type ReactElement } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { RuledTable, type TableColumn } from '../../../components/ruled-table';

interface RemovableTableProps<Row> {
  label: string;
  columns: readonly TableColumn<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string | number;
  /** Names a row in its question: `Take out the rate of 23 % for Ireland?` */
  named: (row: Row) => string;
  /** What follows from taking it out. */
  consequence: string;
  onRemove: (row: Row) => Promise<unknown>;
}

function removeColumn<Row>(named: (row: Row) => string, ask: (row: Row) => void): TableColumn<Row> {
  return {
    key: 'act',
    title: 'Take out',
    quiet: true,
    right: true,
    draw: (row) => (
      <Button size="small" onClick={() => ask(row)} aria-label={`Take out ${named(row)}`}>
        Take out
      </Button>
    ),
  };
}

/** Rules of the shop, each of which can be taken out after a question. */
export function RemovableTable<Row>(props: RemovableTableProps<Row>): ReactElement {
  const { columns, named, consequence, onRemove, ...table } = props;
  const [asking, setAsking] = useState<Row>();
  return (
    <>
      <RuledTable {...table} columns={[...columns, removeColumn(named, (row: Row) => setAsking(() => row))]} />
      <ConfirmDialog
        open={asking !== undefined}
        title={asking === undefined ? '' : `Take out ${named(asking)}?`}
        confirmLabel="Take it out"
        onConfirm={() => (asking === undefined ? Promise.resolve() : onRemove(asking))}
        onClose={() => setAsking(undefined)}
      >
        {consequence}
      </ConfirmDialog>
    </>
  );
}
