import type { ReactElement } from 'react';
import { useRouteError } from 'react-router-dom';
import { sentenceOf } from '../lib/problem';
import { PageHeading } from '../components/page-heading';
import { Press } from '../components/press';
import { NotAllowed } from './access';

const place = { padding: '34px 24px', maxWidth: 1180, margin: '0 auto' };

export function NotFound(): ReactElement {
  return (
    <div style={place}>
      <PageHeading
        title="There is nothing at this address"
        lead="It may have been mistyped, or what stood here has moved. Search for it, or begin again."
        actions={<Press to="/">Go to the front page</Press>}
      />
    </div>
  );
}

/** Shown in place of a page that could not be loaded or drawn; the shell around it stays. */
export function RouteFault(): ReactElement {
  const error = useRouteError();
  if (error instanceof NotAllowed) {
    return (
      <div style={place}>
        <PageHeading
          title="This is not open to you"
          lead="Your role has no business here. If you need it, ask the owner."
        />
      </div>
    );
  }
  const { sentence, requestId } = sentenceOf(error);
  return (
    <div style={place}>
      <PageHeading
        title="This page could not be shown"
        lead={
          <>
            {sentence} {requestId ? `Quote ${requestId} when you report it.` : null}
          </>
        }
        actions={<Press onPress={() => location.reload()}>Load it again</Press>}
      />
    </div>
  );
}

/** The same where no shell stands around it. */
export function RootFault(): ReactElement {
  return (
    <main id="content">
      <RouteFault />
    </main>
  );
}
