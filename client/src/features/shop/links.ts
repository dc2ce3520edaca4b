/** The storefront's own line of links; profile and sign-in stand behind them. */
export const shopLinks: readonly { to: string; label: string }[] = [];
