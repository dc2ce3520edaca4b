import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { copyText } from './copy-text';
import { openPrint } from './open-print';
import type { LabelText } from './printed-label';

/** Copy and print beside the large tag of a page. */
export function TagActions({ kind, code, story }: LabelText): ReactElement {
  return (
    <>
      <Button size="small" variant="text" onClick={() => copyText(code)}>
        Copy
      </Button>
      <Button size="small" variant="text" onClick={() => openPrint({ kind, code, story })}>
        Print the label
      </Button>
    </>
  );
}
