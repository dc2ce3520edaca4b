import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useMatches } from 'react-router-dom';
import { Caution } from '../../../components/caution';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { listingsQuery, type Listing } from '../api/shop';
import { useBasket } from '../basket';
import { CardGrid, ListingCard } from '../components/listing-card';
import { CountryChoice } from '../components/price-line';

interface Shelf {
  title: string;
  lead: string;
  shows: (listing: Listing) => boolean;
}

const shelves: Readonly<Record<string, Shelf>> = {
  irons: {
    title: 'Irons, ready to use',
    lead: 'Built by hand in small batches. Each is measured before it leaves, and has its own page.',
    shows: ({ form }) => form === 'tool',
  },
  kits: {
    title: 'Kits to build yourself',
    lead: 'All parts in bags, the pack built and tested. Each page says which skills it needs.',
    shows: ({ form }) => form === 'kit',
  },
  spares: {
    title: 'Tips and spares',
    lead: 'What wears, and what gets lost.',
    shows: ({ form }) => form === 'spare',
  },
};

const everything: Shelf = {
  title: 'Irons built by hand',
  lead: 'Battery-powered soldering irons in small batches: each one measured, each with its own page.',
  shows: () => true,
};

export function Component(): ReactElement {
  const { country } = useBasket();
  const listings = useQuery(listingsQuery(country));
  const shelf = shelves[useMatches().at(-1)?.id ?? ''] ?? everything;
  const shown = listings.data?.items.filter(shelf.shows);
  return (
    <>
      <PageHeading title={shelf.title} lead={shelf.lead} actions={<CountryChoice />} />
      {listings.isError ? (
        <ErrorState error={listings.error} onRetry={() => void listings.refetch()} what="The shop" />
      ) : null}
      {listings.isPending ? <LoadingState /> : null}
      {listings.data?.ask ? <p>{listings.data.ask}</p> : null}
      {shown?.length === 0 ? (
        <EmptyState title="Nothing is offered here just now">Come back soon, or write to us.</EmptyState>
      ) : null}
      <CardGrid>
        {shown?.map((listing) => (
          <ListingCard key={listing.id} listing={listing} />
        ))}
      </CardGrid>
      <div style={{ marginTop: 30 }}>
        <Caution>
          These irons pass 300 °C within seconds and hold lithium cells. Solder where air moves, keep the tip in its
          rest, and charge only with the lead supplied.
        </Caution>
      </div>
    </>
  );
}
