import type { ReactElement } from 'react';
import { PageHeading } from '../../../components/page-heading';

export function Component(): ReactElement {
  return <PageHeading title="Irons built by hand" lead="Small batches, each one measured, each with its own page." />;
}
