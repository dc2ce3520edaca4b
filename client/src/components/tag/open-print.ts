import { notify } from '../../lib/notify';
import type { LabelText } from './printed-label';

/** The drawing of QR codes is loaded when the first label is printed. */
export function openPrint(label: LabelText): void {
  import('./print-label').then(
    ({ printLabel }) => printLabel(label),
    () => notify('The label could not be loaded. Try again when the connection is back.', { tone: 'hot' }),
  );
}
