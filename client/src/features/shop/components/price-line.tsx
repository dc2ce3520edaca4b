import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import { useId, type ReactElement } from 'react';
import { Price } from '../../../components/figures';
import { formatPromise } from '../../../lib/format-time';
import { frontQuery, type Listing } from '../api/shop';
import { setBasketCountry, useBasket } from '../basket';

const Line = styled('div')(({ theme }) => ({
  display: 'flex',
  flexWrap: 'wrap',
  alignItems: 'baseline',
  gap: '4px 14px',
  '& .price': {
    fontFamily: theme.typography.h1.fontFamily,
    fontWeight: 600,
    fontSize: '2.125rem',
    color: theme.vars.palette.tone.copper,
  },
  '& .vat': { color: theme.vars.palette.tone.inkSoft },
}));

const Select = styled('select')(({ theme }) => ({
  font: 'inherit',
  color: theme.vars.palette.tone.ink,
  background: theme.vars.palette.tone.sheet,
  border: `1px solid ${theme.vars.palette.tone.edge}`,
  borderRadius: 3,
  padding: '6px 8px',
  maxWidth: '100%',
}));

/** Where it goes: decides VAT and delivery, and is kept in the basket. */
export function CountryChoice({ label = 'Where does it go?' }: { label?: string }): ReactElement | null {
  const front = useQuery(frontQuery).data;
  const { country } = useBasket();
  const id = useId();
  if (!front) return null;
  return (
    <span>
      <label htmlFor={id}>{label} </label>
      <Select
        id={id}
        value={country ?? front.country}
        onChange={({ target }) => {
          setBasketCountry(target.value);
        }}
      >
        {front.countries.map(({ code, name }) => (
          <option key={code} value={code}>
            {name}
          </option>
        ))}
      </Select>
    </span>
  );
}

export function PriceLine({ listing, ask }: { listing: Pick<Listing, 'price'>; ask: string | null }): ReactElement {
  if (!listing.price) return <p>{ask ?? 'Ask us for the price.'}</p>;
  const { gross, vatRate, vatCountry } = listing.price;
  return (
    <Line>
      <span className="price">
        <Price value={gross} />
      </span>
      <span className="vat">
        {vatCountry ? `with ${Number(vatRate)} % VAT for ${vatCountry}` : 'without VAT: it leaves the European Union'}
      </span>
    </Line>
  );
}

/** The promise as a sentence; the day is the one that is kept. */
export function PromiseLine({ promise }: { promise: Listing['promise'] }): ReactElement {
  if (!promise.leavesBy) return <p>None is there or on the bench just now. Write to us, and we will tell you when.</p>;
  return (
    <p>
      Leaves the shop by <strong>{formatPromise(promise.leavesBy)}</strong>.
      {promise.fromBatch ? ' It is in the batch on the bench now.' : ''}
    </p>
  );
}
