import { partLimit } from '@emberlot/shared/limits/parts';
import { textLimit } from '@emberlot/shared/limits/text';
import type { ReactElement } from 'react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { CheckInput, ChoiceInput } from '../../../components/form/choice-fields';
import { QuantityInput } from '../../../components/form/number-fields';
import { DayInput, TextInput } from '../../../components/form/text-fields';
import { Caution } from '../../../components/caution';
import { CodeInput } from './code-input';
import { RowList } from './row-list';

export function PartSupplierFields(): ReactElement {
  const rows = useFieldArray({ name: 'suppliers' });
  return (
    <RowList
      legend="Where it is bought"
      rows={rows.fields.map(({ id }, index) => ({ key: id, fields: <SupplierRow index={index} /> }))}
      none="No supplier named: it is made here, or nobody knows yet."
      addLabel="Add a supplier"
      rowName={(index) => `supplier ${index + 1}`}
      onAdd={() =>
        rows.append({ supplier: '', supplierPartCode: '', leadTimeDays: '', preferred: rows.fields.length === 0 })
      }
      onRemove={(index) => rows.remove(index)}
    />
  );
}

export function ParameterFields(): ReactElement {
  const rows = useFieldArray({ name: 'parameters' });
  return (
    <RowList
      legend="Parameters"
      rows={rows.fields.map(({ id }, index) => ({ key: id, fields: <ParameterRow index={index} /> }))}
      none="None yet. They are searched too: resistance, drain-source voltage, case style."
      addLabel="Add a parameter"
      rowName={(index) => `parameter ${index + 1}`}
      onAdd={() => rows.append({ name: '', value: '', unit: '' })}
      onRemove={(index) => rows.remove(index)}
    />
  );
}

function SupplierRow({ index }: { index: number }): ReactElement {
  return (
    <>
      <CodeInput kind="supplier" name={`suppliers.${index}.supplier`} label="Supplier" required width={180} />
      <TextInput
        name={`suppliers.${index}.supplierPartCode`}
        label="Their code for it"
        longest={textLimit.code}
        width={180}
      />
      <QuantityInput
        name={`suppliers.${index}.leadTimeDays`}
        label="Lead time"
        unit="days"
        places={0}
        allow="zero"
        width={130}
      />
      <CheckInput name={`suppliers.${index}.preferred`} label="Order here first" />
    </>
  );
}

function ParameterRow({ index }: { index: number }): ReactElement {
  return (
    <>
      <TextInput
        name={`parameters.${index}.name`}
        label="Parameter"
        longest={partLimit.parameterName}
        required
        width={220}
      />
      <TextInput
        name={`parameters.${index}.value`}
        label="Value"
        longest={partLimit.parameterValue}
        required
        width={160}
      />
      <TextInput name={`parameters.${index}.unit`} label="Unit" longest={partLimit.parameterUnit} width={110} />
    </>
  );
}

export function BatteryFields(): ReactElement {
  const hasBattery: unknown = useWatch({ name: 'hasBattery' });
  return (
    <fieldset>
      <legend>Lithium</legend>
      <CheckInput
        name="hasBattery"
        label="It is a lithium cell or battery"
        hint="Parcels with it need transport papers."
      />
      {hasBattery === true ? <BatteryDetails /> : null}
    </fieldset>
  );
}

function BatteryDetails(): ReactElement {
  const chemistry: unknown = useWatch({ name: 'battery.chemistry' });
  const kind: unknown = useWatch({ name: 'battery.kind' });
  return (
    <>
      <Caution>
        <p>
          Take these figures from the maker’s data sheet and test summary. Check the current edition of the transport
          rules, and ask your carrier.
        </p>
      </Caution>
      <ChoiceInput
        name="battery.kind"
        label="It is a"
        choices={[
          { value: 'cell', label: 'cell' },
          { value: 'battery', label: 'battery of several cells' },
        ]}
        required
        width={240}
      />
      <ChoiceInput
        name="battery.chemistry"
        label="Chemistry"
        choices={[
          { value: 'lithium_ion', label: 'lithium-ion (rechargeable)' },
          { value: 'lithium_metal', label: 'lithium metal (not rechargeable)' },
        ]}
        required
        width={320}
      />
      {chemistry === 'lithium_metal' ? (
        <QuantityInput name="battery.lithiumGrams" label="Lithium in one" unit="g" places={3} required />
      ) : (
        <QuantityInput name="battery.wattHours" label="Energy of one" unit="Wh" places={3} required />
      )}
      {kind === 'battery' ? <QuantityInput name="battery.cellCount" label="Cells in it" places={0} /> : null}
      <TextInput
        name="battery.transportTestReference"
        label="Test summary"
        longest={textLimit.line}
        hint="The reference of the transport test of this very design. Without one a pack is never shipped."
        width={640}
      />
      <DayInput name="battery.transportTestPassedOn" label="Passed on" />
    </>
  );
}
