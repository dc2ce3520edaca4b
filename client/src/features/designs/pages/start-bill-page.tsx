import type { ReactElement } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { PageHeading } from '../../../components/page-heading';
import { billAddress, kitAddress } from '../components/addresses';
import { PartChooser } from '../components/part-chooser';

export function Component(): ReactElement {
  const navigate = useNavigate();
  const asKit = useSearchParams()[0].get('as') === 'kit';
  return (
    <>
      <PageHeading
        title={asKit ? 'Start a contents list' : 'Start a bill'}
        lead={
          asKit
            ? 'For which part? It becomes a kit with its first line.'
            : 'For which part? What goes into it is asked on the next page.'
        }
      />
      <PartChooser
        label="Part"
        hint="Type its code or a few letters of its name, or scan its tag. The part must be on the shelf’s list already."
        submitLabel="Go on"
        onChoose={(code) => void navigate(asKit ? kitAddress(code) : billAddress(code))}
      />
    </>
  );
}
