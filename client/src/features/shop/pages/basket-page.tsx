import { keepPreviousData, useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { Money } from '../../../components/figures';
import { PageHeading } from '../../../components/page-heading';
import { Press } from '../../../components/press';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { frontQuery, quoteQuery, type Quote } from '../api/shop';
import { useBasket } from '../basket';
import { LineTable } from '../components/line-table';
import { CountryChoice, PromiseLine } from '../components/price-line';
import { QuantityField } from '../components/quantity-field';
import { Totals, vatWords } from '../components/totals';

export function Component(): ReactElement {
  const { lines, country } = useBasket();
  const front = useQuery(frontQuery);
  const quote = useQuery({
    ...quoteQuery(country ?? front.data?.country ?? '', '', lines),
    // The table stays while it is priced anew: whoever types in it keeps their place.
    placeholderData: keepPreviousData,
  });
  if (lines.length === 0) {
    return (
      <>
        <PageHeading title="Your basket" />
        <EmptyState title="There is nothing in it yet" action={<Press to="/">See what there is</Press>}>
          Choose an iron, a kit or a spare.
        </EmptyState>
      </>
    );
  }
  return (
    <>
      <PageHeading title="Your basket" actions={<CountryChoice />} />
      {quote.isError ? <ErrorState error={quote.error} onRetry={() => void quote.refetch()} what="The basket" /> : null}
      {quote.isPending ? <LoadingState /> : null}
      {quote.data ? <QuotedBasket quote={quote.data} /> : null}
    </>
  );
}

function QuotedBasket({ quote }: { quote: Quote }): ReactElement {
  return (
    <>
      <LineTable>
        <thead>
          <tr>
            <th>What</th>
            <th className="figure wide">Each, with VAT</th>
            <th>How many</th>
            <th className="figure">Without VAT</th>
          </tr>
        </thead>
        <tbody>
          {quote.lines.map((line) => (
            <tr key={line.listingId}>
              <td>
                <Link to={`/products/${line.slug}`}>{line.title}</Link>
              </td>
              <td className="figure wide">
                <Money value={line.unitGross} />
              </td>
              <td>
                <QuantityField listingId={line.listingId} title={line.title} quantity={line.quantity} />
              </td>
              <td className="figure">
                <Money value={line.net} />
              </td>
            </tr>
          ))}
        </tbody>
      </LineTable>
      {quote.ask ? <output>{quote.ask}</output> : null}
      <QuoteFoot quote={quote} />
      {quote.ask === null ? (
        <Press to="/checkout" main large>
          Go to the address
        </Press>
      ) : null}
    </>
  );
}

/** Totals and promise of a quote; nothing where the shop must be asked. */
export function QuoteFoot({ quote }: { quote: Quote }): ReactElement | null {
  const { delivery, net, vat, gross, promise } = quote;
  if (!delivery || !net || !vat || !gross || !promise) return null;
  return (
    <>
      <Totals {...{ delivery, net, vat, gross }} vatWords={vatWords(quote.vatRate, quote.vatCountry)} />
      {quote.vatNote ? <p>{quote.vatNote}</p> : null}
      <PromiseLine promise={promise} />
    </>
  );
}
