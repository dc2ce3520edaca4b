/** The storefront's own line of links; profile and sign-in stand behind them. */
export const shopLinks: readonly { to: string; label: string }[] = [
  { to: '/irons', label: 'Irons' },
  { to: '/kits', label: 'Kits' },
  { to: '/spares', label: 'Tips and spares' },
  { to: '/own-orders', label: 'Your orders' },
  { to: '/basket', label: 'Basket' },
];

/** What a buyer must be able to read before ordering, from every page. */
export const plainLinks: readonly { to: string; label: string }[] = [
  { to: '/terms', label: 'Terms' },
  { to: '/withdrawal', label: 'Withdrawal' },
  { to: '/privacy', label: 'Privacy' },
];
