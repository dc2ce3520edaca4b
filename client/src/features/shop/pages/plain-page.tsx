import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useMatches } from 'react-router-dom';
import { PageHeading } from '../../../components/page-heading';
import type { Dto } from '../../../api/client';
import { ErrorState, LoadingState } from '../../../components/states';
import { frontQuery } from '../api/shop';

type Front = Dto<'ShopFrontDto'>;

const Text = styled('div')({ maxWidth: 680, '& p': { margin: '0 0 14px' } });

interface PlainPage {
  title: string;
  paragraphs: (shop: Front) => readonly string[];
}

const pages: Readonly<Record<string, PlainPage>> = {
  terms: {
    title: 'Terms',
    paragraphs: (shop) => [
      `You buy from ${shop.legalName}, ${shop.addressLine}, ${shop.postcode} ${shop.city}${shop.vatNumber ? `, VAT number ${shop.vatNumber}` : ''}.`,
      'The contract is made when you press the button that obliges you to pay. Until you have paid, the goods are kept for you for less than an hour.',
      'Prices include the VAT named beside them and the delivery shown before you order. The day named before you order is the day by which it leaves the shop.',
      `We stand behind each tool for ${shop.warrantyMonths} months from the day it left. Your rights under the law of your country are not touched by that.`,
      'A kit needs the skills that its page names. What is built from it is built at your own care: follow the instructions, and have the work looked at by somebody who knows when you are unsure.',
    ],
  },
  privacy: {
    title: 'Privacy',
    paragraphs: (shop) => [
      `We keep what an order needs: your name, your address, your mail address and what you bought. Invoices are kept for as long as the law asks. Nothing is sold, and nothing is handed on but to the carrier and the payments service.`,
      'Your card number is typed on the page of the payments service; we never see it.',
      'This site sets one cookie, for the session. The basket is kept in your browser and holds nothing about you.',
      `Write to ${shop.email} to see what we hold about you, or to have it erased where the law does not ask us to keep it.`,
    ],
  },
  withdrawal: {
    title: 'Withdrawal',
    paragraphs: (shop) => [
      'If you buy as a consumer in the European Union you may withdraw within fourteen days from the day you receive the goods, without giving a reason.',
      `Write to ${shop.email}, or by post to ${shop.legalName}, ${shop.addressLine}, ${shop.postcode} ${shop.city}. Name your order and say that you withdraw. We confirm by mail.`,
      'You send the goods back within fourteen days of that; we give the money back, delivery outward included, once we have them or have proof that they are on their way.',
      'Lithium packs travel under rules of their own: ask us for the papers before you send anything back.',
    ],
  },
};

export function Component(): ReactElement | null {
  const front = useQuery(frontQuery);
  const page = pages[useMatches().at(-1)?.id ?? ''];
  if (!page) return null;
  if (front.isPending) return <LoadingState />;
  if (front.isError) return <ErrorState error={front.error} onRetry={() => void front.refetch()} what="This page" />;
  return (
    <Text>
      <PageHeading title={page.title} />
      {page.paragraphs(front.data).map((paragraph) => (
        <p key={paragraph}>{paragraph}</p>
      ))}
    </Text>
  );
}
