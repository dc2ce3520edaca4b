import MenuItem from '@mui/material/MenuItem';
import Select from '@mui/material/Select';
import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { DenseTable } from '../../../components/dense-table';
import { Flag } from '../../../components/flag';
import { formatCount } from '../../../lib/format-quantity';
import type { ImportCheck, ImportKind } from '../api/imports';

export function WhatIsTaken({ kind }: { kind: ImportKind }): ReactElement {
  return (
    <DenseTable
      label="What the columns hold"
      columns={[
        { key: 'title', title: 'Column', width: 240 },
        { key: 'required', title: '', width: 90 },
        { key: 'sentence', title: 'What belongs there' },
      ]}
    >
      {kind.columns.map(({ key, title, required, sentence }) => (
        <tr key={key}>
          <td>{title}</td>
          <td>{required ? 'needed' : ''}</td>
          <td className="quiet">{sentence}</td>
        </tr>
      ))}
    </DenseTable>
  );
}

export function FaultsTable({ check }: { check: ImportCheck }): ReactElement {
  const more = check.faultCount - check.faults.length;
  return (
    <>
      <DenseTable
        label="Faults"
        columns={[
          { key: 'line', title: 'Line', figure: true, width: 80 },
          { key: 'column', title: 'Column', width: 220 },
          { key: 'sentence', title: 'What is wrong' },
        ]}
      >
        {check.faults.map((fault) => (
          <tr key={`${fault.line} ${fault.column ?? ''} ${fault.sentence}`}>
            <td className="figure">{fault.line}</td>
            <td>{fault.column ?? 'the line'}</td>
            <td>{fault.sentence}</td>
          </tr>
        ))}
      </DenseTable>
      {more > 0 ? <p>And {formatCount(more, 'fault')} more.</p> : null}
    </>
  );
}

const separatorWords: Readonly<Record<string, string>> = { ',': 'commas', ';': 'semicolons', '\t': 'tabs' };

interface ColumnsTableProps {
  check: ImportCheck;
  kind: ImportKind;
  onChoose: (index: number, key: string | null) => void;
  onDecimalSign: (sign: 'point' | 'comma') => void;
}

/** The columns as they were found, each to be corrected. */
export function ColumnsTable({ check, kind, onChoose, onDecimalSign }: ColumnsTableProps): ReactElement {
  return (
    <>
      <p style={{ margin: '0 0 10px' }}>
        Cells are cut at {separatorWords[check.separator] ?? check.separator}. {signWords(check.decimalSign)}{' '}
        <Button
          size="small"
          variant="text"
          onClick={() => onDecimalSign(check.decimalSign === 'comma' ? 'point' : 'comma')}
        >
          Read decimals after a {check.decimalSign === 'comma' ? 'point' : 'comma'}
        </Button>
      </p>
      <DenseTable
        label="Columns"
        columns={[
          { key: 'header', title: 'In the file', width: 260 },
          { key: 'key', title: 'Is', width: 300 },
          { key: 'sample', title: 'For example' },
        ]}
      >
        {check.columns.map((column) => (
          <tr key={column.index}>
            <td>{column.header || `column ${column.index + 1}`}</td>
            <td>
              <ColumnChoice column={column} kind={kind} onChoose={onChoose} />
            </td>
            <td className="quiet">{column.sample}</td>
          </tr>
        ))}
      </DenseTable>
    </>
  );
}

function signWords(sign: ImportCheck['decimalSign']): string {
  if (sign === null) return 'No number in it shows which sign stands before decimals.';
  return `Decimals stand after a ${sign}.`;
}

interface ColumnChoiceProps {
  column: ImportCheck['columns'][number];
  kind: ImportKind;
  onChoose: ColumnsTableProps['onChoose'];
}

function ColumnChoice({ column, kind, onChoose }: ColumnChoiceProps): ReactElement {
  const known = kind.columns.some(({ key }) => key === column.key);
  // A column of the file's own making, such as a parameter, is taken as it is.
  if (column.key !== null && !known) return <Flag tone="sound">{column.title}</Flag>;
  return (
    <Select
      size="small"
      value={column.key ?? ''}
      displayEmpty
      onChange={({ target }) => onChoose(column.index, target.value === '' ? null : target.value)}
      slotProps={{ input: { 'aria-label': `What ${column.header} is` } }}
      sx={{ minWidth: 240 }}
    >
      <MenuItem value="">leave it alone</MenuItem>
      {kind.columns.map(({ key, title }) => (
        <MenuItem key={key} value={key}>
          {title}
        </MenuItem>
      ))}
    </Select>
  );
}
