import { flushSync } from 'react-dom';
import { createRoot } from 'react-dom/client';
import { PrintedLabel, type LabelText } from './printed-label';

/** Opens the browser's print dialog with nothing but the label on the page. */
export function printLabel(label: LabelText): void {
  const place = document.createElement('div');
  place.dataset.printLabel = '';
  document.body.append(place);
  const root = createRoot(place);
  flushSync(() => root.render(<PrintedLabel {...label} />));
  document.body.dataset.printing = 'label';
  window.addEventListener(
    'afterprint',
    () => {
      delete document.body.dataset.printing;
      root.unmount();
      place.remove();
    },
    { once: true },
  );
  window.print();
}
