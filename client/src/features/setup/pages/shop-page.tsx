import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { PageHeading } from '../../../components/page-heading';
import { ErrorState, LoadingState } from '../../../components/states';
import { shopQuery } from '../api/shop';
import { ShopForm } from '../components/shop-form';

export function Component(): ReactElement {
  const answer = useQuery(shopQuery);
  if (answer.isError) return <ErrorState error={answer.error} onRetry={() => void answer.refetch()} what="The shop" />;
  if (answer.isPending) return <LoadingState lines={10} />;
  const { shop, zone } = answer.data;
  return (
    <>
      <PageHeading
        title={shop ? 'The shop' : 'Set up the shop'}
        lead={
          shop
            ? `What customers, papers and the books go by. Its days begin and end in ${zone}.`
            : 'Nothing can be received, built or sold before the shop has a name, an address and a currency.'
        }
      />
      <ShopForm key={shop ? 'known' : 'new'} shop={shop} />
    </>
  );
}
