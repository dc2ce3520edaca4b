import type { ReactElement } from 'react';
import { Caution } from '../../../components/caution';
import { PageHeading } from '../../../components/page-heading';
import { VatExceptions } from '../components/vat-exceptions';
import { VatRates } from '../components/vat-rates';

export function Component(): ReactElement {
  return (
    <>
      <PageHeading
        title="VAT"
        lead="Rates by country and first day. An order takes the rate of its tax point; a case that no rule covers is “ask us” and can’t be paid."
      />
      <div style={{ maxWidth: 1180, marginBottom: 24 }}>
        <Caution>
          <p>
            Rates change. Read them from the country’s own source before you rely on them, and ask your tax adviser.
          </p>
        </Caution>
      </div>
      <VatRates />
      <VatExceptions />
    </>
  );
}
