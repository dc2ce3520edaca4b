import { billLimit } from '@emberlot/shared/limits/bills';
import { textLimit } from '@emberlot/shared/limits/text';
import type { ReactElement } from 'react';
import { useFieldArray, useFormContext } from 'react-hook-form';
import { emptyStep, type BillValues } from './bill-values';
import { LongTextCell, TextCell } from './cells';
import { EditableRows, RowActs, type RowColumn } from './rows';

const columns: readonly RowColumn[] = [
  { key: 'number', title: '', width: 30 },
  { key: 'title', title: 'What to do', width: '24%' },
  { key: 'instruction', title: 'How' },
  { key: 'minutes', title: 'Minutes', width: 90 },
  { key: 'caution', title: 'Caution shown at the step', width: '26%' },
  { key: 'acts', title: '', width: 110 },
];

export function StepsEditor(): ReactElement {
  const { control } = useFormContext<BillValues>();
  const { fields, append, remove, move } = useFieldArray({ control, name: 'steps' });
  return (
    <EditableRows
      title="Build steps"
      hint="In the order in which they are done. Alt and an arrow moves a step."
      columns={columns}
      count={fields.length}
      addLabel="Add a step"
      onAdd={() => append({ ...emptyStep }, { focusName: `steps.${fields.length}.title` })}
      onRemove={remove}
      onMove={move}
    >
      {fields.map(({ id }, row) => {
        const cell = (column: string, title: string) => ({
          name: `steps.${row}.${column}`,
          label: `${title}, step ${row + 1}`,
          row,
          column,
        });
        return (
          <tr key={id}>
            <td aria-hidden="true">{row + 1}</td>
            <td>
              <TextCell {...cell('title', 'What to do')} longest={billLimit.title} />
            </td>
            <td>
              <LongTextCell {...cell('instruction', 'How')} longest={textLimit.note} />
            </td>
            <td>
              <TextCell {...cell('minutes', 'Minutes')} figure />
            </td>
            <td>
              <LongTextCell {...cell('caution', 'Caution')} longest={billLimit.caution} />
            </td>
            <RowActs what={`step ${row + 1}`} row={row} count={fields.length} onRemove={remove} onMove={move} />
          </tr>
        );
      })}
    </EditableRows>
  );
}
