import { textLimit } from '@emberlot/shared/limits/text';
import type { ReactElement } from 'react';
import { Caution } from '../../../components/caution';
import { ChoiceInput, ManyInput } from '../../../components/form/choice-fields';
import { Form } from '../../../components/form/form';
import { MoneyInput, QuantityInput } from '../../../components/form/number-fields';
import { DayInput, TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { notify } from '../../../lib/notify';
import { useEditShop, useSetUpShop, type Shop } from '../api/shop';
import { CountryInput } from './country-input';
import { currencyChoices, weekdayChoices } from './shop-choices';
import { emptyShop, shopInput, shopValues, type ShopValues } from './shop-values';

interface ShopFormProps {
  /** Null until the shop is set up. */
  shop: Shop | null;
}

export function ShopForm({ shop }: ShopFormProps): ReactElement {
  const setUp = useSetUpShop();
  const edit = useEditShop();
  const form = useDraftForm<ShopValues>({ name: 'shop', defaultValues: shop ? shopValues(shop) : emptyShop });
  const send = async (values: ShopValues): Promise<Shop> => {
    const input = shopInput(values);
    const kept = shop ? await edit.mutateAsync({ ...input, version: values.version }) : await setUp.mutateAsync(input);
    notify(shop ? 'The shop is kept.' : 'The shop is open.');
    return kept;
  };
  return (
    <Form
      form={form}
      onSubmit={send}
      submitLabel={shop ? 'Keep these' : 'Open the shop'}
      valuesOf={(current) => shopValues(current as Shop)}
    >
      <NameAndAddress />
      <Papers />
      <Working currency={form.watch('currency')} currencyStays={shop?.currencyStays ?? false} />
    </Form>
  );
}

function NameAndAddress(): ReactElement {
  return (
    <fieldset>
      <legend>Name and address</legend>
      <TextInput name="name" label="Name" hint="As customers know it." longest={textLimit.name} required />
      <TextInput
        name="legalName"
        label="Legal name"
        hint="As it stands on invoices."
        longest={textLimit.name}
        required
      />
      <TextInput
        name="addressLine"
        label="Street and number"
        longest={textLimit.line}
        autoComplete="street-address"
        required
      />
      <TextInput name="postcode" label="Postcode" longest={16} autoComplete="postal-code" width={200} required />
      <TextInput name="city" label="Town" longest={textLimit.name} autoComplete="address-level2" required />
      <CountryInput name="countryCode" label="Country" />
      <TextInput name="email" label="E-mail address" type="email" longest={textLimit.email} required />
      <TextInput name="phone" label="Telephone" type="tel" longest={textLimit.code} width={280} />
    </fieldset>
  );
}

function Papers(): ReactElement {
  return (
    <fieldset>
      <legend>What stands on papers</legend>
      <TextInput
        name="vatNumber"
        label="VAT number"
        hint="With the letters of its country in front."
        code
        longest={15}
        width={280}
      />
      <TextInput name="registrationNumber" label="Registration number" code longest={textLimit.code} width={280} />
      <TextInput name="bankName" label="Bank" longest={textLimit.name} />
      <TextInput name="iban" label="IBAN" code longest={42} />
      <DayInput
        name="oneStopShopFrom"
        label="One-stop shop from"
        hint="From this day consumers elsewhere in the union pay the VAT of their own country. Leave it open if you have not elected it."
      />
      <Caution>
        <p>
          The product helps you to prepare what you declare. Check the current rules and your own registration, and ask
          your tax adviser.
        </p>
      </Caution>
    </fieldset>
  );
}

function Working({ currency, currencyStays }: { currency: string; currencyStays: boolean }): ReactElement {
  return (
    <fieldset>
      <legend>How it works</legend>
      <ChoiceInput
        name="currency"
        label="Currency of the books"
        choices={currencyChoices}
        hint={
          currencyStays ? 'It stays, because something is posted in it.' : 'It stays once something is posted in it.'
        }
        disabled={currencyStays}
        width={320}
        required
      />
      <MoneyInput name="labourRateMinor" label="An hour at the bench costs" currency={currency} required />
      <ManyInput
        name="workingWeekdays"
        label="Days on which you work"
        choices={weekdayChoices}
        required="Choose at least one day."
      />
      <QuantityInput
        name="handlingDays"
        label="From an order to its parcel"
        unit="working days"
        places={0}
        allow="zero"
        required
      />
      <QuantityInput
        name="checkoutHoldMinutes"
        label="Goods stay claimed for a buyer who is paying"
        unit="minutes"
        places={0}
        required
      />
      <QuantityInput name="warrantyMonths" label="Warranty" unit="months" places={0} allow="zero" required />
    </fieldset>
  );
}
