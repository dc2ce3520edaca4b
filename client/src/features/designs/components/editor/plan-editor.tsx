import { billLimit } from '@emberlot/shared/limits/bills';
import type { ReactElement } from 'react';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { emptyCharacteristic, type BillValues } from './bill-values';
import { ChoiceCell, LongTextCell, TextCell } from './cells';
import { EditableRows, RowActs, type RowColumn } from './rows';

const columns: readonly RowColumn[] = [
  { key: 'number', title: '', width: 30 },
  { key: 'name', title: 'What is looked at', width: '18%' },
  { key: 'kind', title: 'Answered by', width: 124 },
  { key: 'lowerLimit', title: 'At least', width: 84 },
  { key: 'target', title: 'Aim', width: 84 },
  { key: 'upperLimit', title: 'At most', width: 84 },
  { key: 'unit', title: 'Unit', width: 64 },
  { key: 'digits', title: 'Decimals', width: 70 },
  { key: 'condition', title: 'Taken at' },
  { key: 'caution', title: 'Caution shown at the reading' },
  { key: 'acts', title: '', width: 110 },
];

export function PlanEditor(): ReactElement {
  const { control } = useFormContext<BillValues>();
  const { fields, append, remove, move } = useFieldArray({ control, name: 'testPlan' });
  return (
    <EditableRows
      title="Test plan"
      hint="What every unit is measured against, in the order in which it is done."
      columns={columns}
      count={fields.length}
      addLabel="Add a line to the test plan"
      onAdd={() => append({ ...emptyCharacteristic }, { focusName: `testPlan.${fields.length}.name` })}
      onRemove={remove}
      onMove={move}
    >
      {fields.map(({ id }, row) => (
        <PlanRow key={id} row={row} count={fields.length} onRemove={remove} onMove={move} />
      ))}
    </EditableRows>
  );
}

interface PlanRowProps {
  row: number;
  count: number;
  onRemove: (row: number) => void;
  onMove: (from: number, to: number) => void;
}

function PlanRow({ row, count, onRemove, onMove }: PlanRowProps): ReactElement {
  const yesNo = useWatch<BillValues>({ name: `testPlan.${row}.kind` }) === 'yes_no';
  const cell = (column: string, title: string) => ({
    name: `testPlan.${row}.${column}`,
    label: `${title}, test ${row + 1}`,
    row,
    column,
  });
  return (
    <tr>
      <td aria-hidden="true">{row + 1}</td>
      <td>
        <TextCell {...cell('name', 'What is looked at')} longest={billLimit.title} />
      </td>
      <td>
        <ChoiceCell {...cell('kind', 'Answered by')}>
          <option value="numeric">a number</option>
          <option value="yes_no">yes or no</option>
        </ChoiceCell>
      </td>
      <td>
        <TextCell {...cell('lowerLimit', 'At least')} figure disabled={yesNo} />
      </td>
      <td>
        <TextCell {...cell('target', 'Aim')} figure disabled={yesNo} />
      </td>
      <td>
        <TextCell {...cell('upperLimit', 'At most')} figure disabled={yesNo} />
      </td>
      <td>
        <TextCell {...cell('unit', 'Unit')} longest={billLimit.unit} disabled={yesNo} />
      </td>
      <td>
        <TextCell {...cell('digits', 'Decimals')} figure disabled={yesNo} />
      </td>
      <td>
        <TextCell {...cell('condition', 'Taken at')} longest={billLimit.condition} />
      </td>
      <td>
        <LongTextCell {...cell('caution', 'Caution')} longest={billLimit.caution} />
      </td>
      <RowActs what={`test ${row + 1}`} row={row} count={count} onRemove={onRemove} onMove={onMove} />
    </tr>
  );
}
