import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { Money } from '../../../components/figures';
import type { MoneyAmount } from '../../../lib/format-money';

const Sums = styled('dl')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: '1fr auto',
  gap: '6px 0',
  margin: '14px 0',
  maxWidth: 460,
  '& dd': { margin: 0, paddingLeft: 24, textAlign: 'right' },
  '& .last': { fontWeight: 600, borderTop: `1px solid ${theme.vars.palette.tone.edge}`, paddingTop: 6 },
}));

interface TotalsProps {
  delivery: MoneyAmount;
  net: MoneyAmount;
  vat: MoneyAmount;
  gross: MoneyAmount;
  /** Such as `23 % VAT for Ireland`. */
  vatWords: string;
}

/** What an order comes to: delivery, VAT, and all of it. */
export function Totals({ delivery, net, vat, gross, vatWords }: TotalsProps): ReactElement {
  return (
    <Sums>
      <dt>Delivery, without VAT</dt>
      <dd>
        <Money value={delivery} />
      </dd>
      <dt>Together, without VAT</dt>
      <dd>
        <Money value={net} />
      </dd>
      <dt>{vatWords}</dt>
      <dd>
        <Money value={vat} />
      </dd>
      <dt className="last">To pay</dt>
      <dd className="last">
        <Money value={gross} />
      </dd>
    </Sums>
  );
}

export function vatWords(rate: string | null, country: string | null): string {
  return country ? `${Number(rate)} % VAT for ${country}` : 'No VAT: it leaves the European Union';
}
