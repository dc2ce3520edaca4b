import type { ReactElement } from 'react';
import { PageHeading } from '../../../components/page-heading';

export function Component(): ReactElement {
  return <PageHeading title="Today" />;
}
