import { textLimit } from '@emberlot/shared/limits/text';
import { keepPreviousData, useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useWatch } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { sessionQuery } from '../../../api/session';
import { Caution } from '../../../components/caution';
import { CheckInput } from '../../../components/form/choice-fields';
import { Form } from '../../../components/form/form';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { Press } from '../../../components/press';
import { EmptyState } from '../../../components/states';
import { frontQuery, quoteQuery, rememberOrderToken, usePlaceOrder, type Quote } from '../api/shop';
import { emptyBasket, useBasket } from '../basket';
import { CountryChoice } from '../components/price-line';
import { QuoteFoot } from './basket-page';

const nothing = {
  email: '',
  recipient: '',
  company: '',
  addressLine: '',
  addressLine2: '',
  city: '',
  postcode: '',
  termsAccepted: false,
};

export function Component(): ReactElement {
  const { lines } = useBasket();
  if (lines.length > 0) return <Checkout />;
  return (
    <>
      <PageHeading title="Order" />
      <EmptyState title="The basket is empty" action={<Press to="/">See what there is</Press>}>
        Put something in it first.
      </EmptyState>
    </>
  );
}

function Checkout(): ReactElement {
  const { lines, country } = useBasket();
  const front = useQuery(frontQuery).data;
  const person = useQuery(sessionQuery).data?.person;
  const navigate = useNavigate();
  const place = usePlaceOrder();
  const { keyFor, done } = useIdempotencyKey();
  const form = useDraftForm({
    name: 'checkout',
    defaultValues: { ...nothing, email: person?.email ?? '', recipient: person?.name ?? '' },
  });
  const postcode = useWatch({ control: form.control, name: 'postcode' });
  const destination = country ?? front?.country ?? '';
  const { data: quote, isPlaceholderData: priceIsOld } = useQuery({
    ...quoteQuery(destination, postcode.trim(), lines),
    placeholderData: keepPreviousData,
  });

  const send = async (values: typeof nothing): Promise<void> => {
    if (priceIsOld) throw new Error('The price for this address is being worked out. Look at it, then order.');
    if (!quote?.gross || !quote.promise?.leavesBy) throw new Error(quote?.ask ?? 'The price is not there yet.');
    const { company, addressLine2, ...address } = values;
    const body = {
      ...address,
      ...(company ? { company } : {}),
      ...(addressLine2 ? { addressLine2 } : {}),
      country: destination,
      lines: [...lines],
      expectedGross: quote.gross.amount,
      expectedDay: quote.promise.leavesBy,
    };
    const placed = await place.mutateAsync({ key: keyFor(body), body });
    done();
    rememberOrderToken(placed.number, placed.guestToken);
    emptyBasket();
    if (placed.paymentPage) location.assign(placed.paymentPage);
    else await navigate(`/orders/${placed.number}`);
  };

  return (
    <>
      <PageHeading title="Order" lead="Your address, and what it comes to." actions={<CountryChoice />} />
      <Form form={form} onSubmit={send} submitLabel="Order with obligation to pay" label="Order">
        <TextInput
          name="email"
          label="E-mail address"
          type="email"
          autoComplete="email"
          longest={textLimit.email}
          required
        />
        <TextInput name="recipient" label="Name" autoComplete="name" longest={textLimit.name} required />
        <TextInput name="company" label="Company" autoComplete="organization" longest={textLimit.name} />
        <TextInput
          name="addressLine"
          label="Street and number"
          autoComplete="address-line1"
          longest={textLimit.line}
          required
        />
        <TextInput
          name="addressLine2"
          label="More of the address"
          autoComplete="address-line2"
          longest={textLimit.line}
        />
        <TextInput name="postcode" label="Postcode" autoComplete="postal-code" longest={16} required />
        <TextInput name="city" label="Town" autoComplete="address-level2" longest={textLimit.name} required />
        <Summary quote={quote} />
        <CheckInput
          name="termsAccepted"
          label="I have read the terms, and the notes on withdrawal."
          mustBeTicked="Read and accept the terms first."
        />
        <p>
          <Link to="/terms">Terms</Link>, <Link to="/withdrawal">withdrawal</Link>, <Link to="/privacy">privacy</Link>.
          The next page, where you pay, belongs to our payments service; we never see your card.
        </p>
      </Form>
    </>
  );
}

function Summary({ quote }: { quote: Quote | undefined }): ReactElement | null {
  if (!quote) return null;
  return (
    <section aria-label="What it comes to">
      <ul>
        {quote.lines.map(({ listingId, quantity, title }) => (
          <li key={listingId}>
            {quantity} × {title}
          </li>
        ))}
      </ul>
      {quote.ask ? <output>{quote.ask}</output> : null}
      <QuoteFoot quote={quote} />
      {quote.lines.some(({ form }) => form !== 'spare') ? (
        <Caution>
          Hot within seconds. Lithium cells inside: charge only with the lead supplied, keep the pack closed.
        </Caution>
      ) : null}
    </section>
  );
}
