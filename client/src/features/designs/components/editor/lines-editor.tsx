import { billLimit } from '@emberlot/shared/limits/bills';
import { textLimit } from '@emberlot/shared/limits/text';
import type { ReactElement } from 'react';
import { useFieldArray, useFormContext } from 'react-hook-form';
import type { BillPart } from '../../api/bills';
import { emptyLine, type BillValues } from './bill-values';
import { CodesCell, PartCell, TextCell } from './cells';
import { EditableRows, RowActs, type RowColumn } from './rows';

const columns: readonly RowColumn[] = [
  { key: 'position', title: 'Position', width: 84 },
  { key: 'part', title: 'Part', width: '22%' },
  { key: 'quantityPer', title: 'For one', width: 104 },
  { key: 'scrapPercent', title: 'Scrap %', width: 84 },
  { key: 'marks', title: 'Marks' },
  { key: 'alternates', title: 'May be replaced by' },
  { key: 'note', title: 'Note' },
  { key: 'acts', title: '', width: 40 },
];

export function LinesEditor({ known }: { known: ReadonlyMap<string, BillPart> }): ReactElement {
  const { control, getValues } = useFormContext<BillValues>();
  const { fields, append, remove } = useFieldArray({ control, name: 'lines' });
  const add = (): void => {
    append(emptyLine(getValues('lines')), { focusName: `lines.${fields.length}.part` });
  };
  return (
    <EditableRows
      title="Lines"
      hint="Enter goes down, and begins a line after the last. Alt and Delete takes a line out."
      columns={columns}
      count={fields.length}
      addLabel="Add a line"
      onAdd={add}
      onRemove={remove}
    >
      {fields.map(({ id }, row) => {
        const cell = (column: string, title: string) => ({
          name: `lines.${row}.${column}`,
          label: `${title}, line ${row + 1}`,
          row,
          column,
        });
        return (
          <tr key={id}>
            <td>
              <TextCell {...cell('position', 'Position')} figure />
            </td>
            <td>
              <PartCell {...cell('part', 'Part')} known={known} />
            </td>
            <td>
              <TextCell {...cell('quantityPer', 'For one')} figure />
            </td>
            <td>
              <TextCell {...cell('scrapPercent', 'Scrap %')} figure />
            </td>
            <td>
              <TextCell {...cell('marks', 'Marks')} longest={billLimit.marks} />
            </td>
            <td>
              <CodesCell {...cell('alternates', 'May be replaced by')} />
            </td>
            <td>
              <TextCell {...cell('note', 'Note')} longest={textLimit.line} />
            </td>
            <RowActs what={`line ${row + 1}`} row={row} count={fields.length} onRemove={remove} />
          </tr>
        );
      })}
    </EditableRows>
  );
}
