import { codePattern } from '@emberlot/shared/limits/codes';
import { textLimit } from '@emberlot/shared/limits/text';
import { stockMeasureCodes, stockMeasures } from '@emberlot/shared/measure/stock-measures';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useWatch } from 'react-hook-form';
import { ChoiceInput, RadioInput } from '../../../components/form/choice-fields';
import { QuantityInput } from '../../../components/form/number-fields';
import { TextInput } from '../../../components/form/text-fields';
import { countriesQuery } from '../api/suppliers';
import { BatteryFields, ParameterFields, PartSupplierFields } from './part-row-fields';
import { tracedChoices } from './shelf-words';

const measureChoices = stockMeasureCodes.map((value) => ({
  value,
  label: stockMeasures[value].name === value ? value : `${stockMeasures[value].name} (${value})`,
}));

interface PartFieldsProps {
  /** Measure and way of following stay once something has moved. */
  moved: boolean;
}

/** All of a part, for a new one and for one that is edited. */
export function PartFields({ moved }: PartFieldsProps): ReactElement {
  const traced: unknown = useWatch({ name: 'traced' });
  const measure: unknown = useWatch({ name: 'measure' });
  const unit = typeof measure === 'string' ? measure : '';
  const stays = moved ? 'It stays, because something has moved already.' : undefined;
  return (
    <>
      <fieldset>
        <legend>What it is</legend>
        <TextInput
          name="code"
          label="Code"
          longest={32}
          code
          required
          hint="What is printed on its tag: letters, digits and the signs - . /"
          rules={{
            validate: (typed: unknown) =>
              codePattern.part.test(String(typed).trim().toUpperCase()) ||
              'Use letters, digits and the signs - . /, beginning with a letter or digit.',
          }}
          width={320}
        />
        <TextInput name="name" label="Name" longest={textLimit.name} required width={640} />
        <TextInput name="description" label="Description" longest={textLimit.note} rows={2} width={640} />
        <ChoiceInput
          name="measure"
          label="Kept in"
          choices={measureChoices}
          required
          disabled={moved}
          hint={stays}
          width={240}
        />
        <RadioInput name="traced" label="Followed" choices={tracedChoices} required disabled={moved} hint={stays} />
        {traced === 'single' ? (
          <TextInput
            name="serialLetters"
            label="Letters of its serial numbers"
            longest={3}
            code
            required
            hint="Two or three capitals; no other part may have them."
            width={240}
          />
        ) : null}
      </fieldset>
      <StockFields unit={unit} />
      <PartSupplierFields />
      <ParameterFields />
      <BatteryFields />
    </>
  );
}

function StockFields({ unit }: { unit: string }): ReactElement {
  const countries = useQuery(countriesQuery).data?.items ?? [];
  return (
    <fieldset>
      <legend>On the shelf and on its way</legend>
      <QuantityInput
        name="reorderPoint"
        label="Order below"
        unit={unit}
        places={6}
        allow="zero"
        hint="It stands in the queue when less than this is free."
      />
      <QuantityInput
        name="unitWeightG"
        label={`Weight of one ${unit}`}
        unit="g"
        places={6}
        allow="zero"
        hint="Parcels and kits are checked by it."
      />
      <QuantityInput name="shelfLifeDays" label="Keeps for" unit="days" places={0} hint="New lots expire after this." />
      <ChoiceInput
        name="originCountryCode"
        label="Country of origin"
        choices={countries.map(({ code, name }) => ({ value: code, label: name }))}
        none="not said"
        width={320}
      />
      <TextInput
        name="commodityCode"
        label="Commodity code"
        longest={10}
        code
        hint="For customs, 4 to 10 digits."
        width={240}
      />
    </fieldset>
  );
}
