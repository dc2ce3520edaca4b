import { useEffect } from 'react';

const product = 'Emberlot';

/** The tab's title while a page is shown: `Parts, Emberlot`. */
export function useDocumentTitle(title: string | undefined): void {
  useEffect(() => {
    if (title === undefined) return;
    document.title = title === product ? product : `${title}, ${product}`;
  }, [title]);
}
