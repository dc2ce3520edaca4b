import { currencyDecimals, minorToDecimal } from '../../../lib/format-money';
import { parseMinor } from '../../../lib/parse-number';
import type { Shop, ShopInput } from '../api/shop';

/** The shop as its form holds it: numbers as they are typed, named as in what is sent. */
export interface ShopValues {
  name: string;
  legalName: string;
  addressLine: string;
  city: string;
  postcode: string;
  countryCode: string;
  email: string;
  phone: string;
  vatNumber: string;
  registrationNumber: string;
  bankName: string;
  iban: string;
  currency: string;
  workingWeekdays: string[];
  handlingDays: string;
  checkoutHoldMinutes: string;
  labourRateMinor: string;
  warrantyMonths: string;
  oneStopShopFrom: string;
  version: number;
}

export const emptyShop: ShopValues = {
  name: '',
  legalName: '',
  addressLine: '',
  city: '',
  postcode: '',
  countryCode: '',
  email: '',
  phone: '',
  vatNumber: '',
  registrationNumber: '',
  bankName: '',
  iban: '',
  currency: 'EUR',
  workingWeekdays: ['1', '2', '3', '4', '5'],
  handlingDays: '2',
  checkoutHoldMinutes: '60',
  labourRateMinor: '',
  warrantyMonths: '24',
  oneStopShopFrom: '',
  version: 0,
};

export function shopValues(shop: Shop): ShopValues {
  return {
    name: shop.name,
    legalName: shop.legalName,
    addressLine: shop.addressLine,
    city: shop.city,
    postcode: shop.postcode,
    countryCode: shop.countryCode,
    email: shop.email,
    phone: shop.phone ?? '',
    vatNumber: shop.vatNumber ?? '',
    registrationNumber: shop.registrationNumber ?? '',
    bankName: shop.bankName ?? '',
    iban: shop.iban ?? '',
    currency: shop.currency,
    workingWeekdays: shop.workingWeekdays.map(String),
    handlingDays: String(shop.handlingDays),
    checkoutHoldMinutes: String(shop.checkoutHoldMinutes),
    labourRateMinor: minorToDecimal(shop.labourRateMinor, currencyDecimals(shop.currency)),
    warrantyMonths: String(shop.warrantyMonths),
    oneStopShopFrom: shop.oneStopShopFrom ?? '',
    version: shop.version,
  };
}

const bare = (text: string): string => text.replace(/\s/g, '').toUpperCase();

/** What is sent; the form has checked that every number is one. */
export function shopInput({ version: _version, ...values }: ShopValues): ShopInput {
  return {
    ...values,
    phone: values.phone || null,
    vatNumber: bare(values.vatNumber) || null,
    registrationNumber: values.registrationNumber || null,
    bankName: values.bankName || null,
    iban: bare(values.iban) || null,
    workingWeekdays: values.workingWeekdays.map(Number),
    handlingDays: Number(values.handlingDays),
    checkoutHoldMinutes: Number(values.checkoutHoldMinutes),
    labourRateMinor: parseMinor(values.labourRateMinor, currencyDecimals(values.currency)) ?? 0,
    warrantyMonths: Number(values.warrantyMonths),
    oneStopShopFrom: values.oneStopShopFrom || null,
  };
}
