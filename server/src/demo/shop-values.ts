/** Fernhollow Tools: our own invention. */
export const demoShopValues = {
  name: 'Fernhollow Tools',
  legalName: 'Fernhollow Tools Limited',
  addressLine: '4 Mill Lane',
  city: 'Ballyhollow',
  postcode: 'X99 AB12',
  countryCode: 'IE',
  email: 'shop@fernhollow.example',
  vatNumber: null,
  currency: 'EUR',
  workingWeekdays: [1, 2, 3, 4, 5],
  handlingDays: 2,
  checkoutHoldMinutes: 45,
  labourRateMinor: 3_600,
  warrantyMonths: 24,
  oneStopShopFrom: '2024-01-01',
};
