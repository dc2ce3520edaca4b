import { styled } from '@mui/material/styles';
import { useSyncExternalStore, type ReactElement } from 'react';
import { formatMoney, formatPrice, formatUnitCost, type MoneyAmount } from '../lib/format-money';
import { formatQuantity, formatReading } from '../lib/format-quantity';
import { formatInstant, formatRelative } from '../lib/format-time';

const Figure = styled('span')(({ theme }) => ({
  fontFamily: theme.typography.mono.fontFamily,
  fontVariantNumeric: 'tabular-nums',
  whiteSpace: 'nowrap',
}));

export function Money({ value }: { value: MoneyAmount }): ReactElement {
  return <Figure>{formatMoney(value)}</Figure>;
}

/** A price as the storefront says it, currency first. */
export function Price({ value }: { value: MoneyAmount }): ReactElement {
  return <span>{formatPrice(value)}</span>;
}

export function UnitCost({ cost, currency, unit }: { cost: string; currency: string; unit?: string }): ReactElement {
  return <Figure>{formatUnitCost(cost, currency, unit)}</Figure>;
}

interface QuantityProps {
  value: string;
  unit?: string;
  /** Places to keep, where figures line up under each other. */
  decimals?: number;
}

export function Quantity({ value, unit, decimals }: QuantityProps): ReactElement {
  return <Figure>{formatQuantity(value, unit, decimals)}</Figure>;
}

/** A measured value, with exactly the digits its instrument gave. */
export function Reading({ value, unit }: { value: string; unit?: string }): ReactElement {
  return <Figure>{formatReading(value, unit)}</Figure>;
}

const everyMinute = 60_000;
const minuteNow = (): number => Math.floor(Date.now() / everyMinute) * everyMinute;

function subscribeToMinutes(changed: () => void): () => void {
  const timer = setInterval(changed, everyMinute / 2);
  return () => clearInterval(timer);
}

/** How long ago or until, with the exact instant in the shop's zone on hover. */
export function When({ instant }: { instant: string }): ReactElement {
  const now = useSyncExternalStore(subscribeToMinutes, minuteNow);
  return (
    <time dateTime={instant} title={formatInstant(instant)}>
      {formatRelative(instant, now)}
    </time>
  );
}
