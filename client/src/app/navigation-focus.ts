import { useEffect } from 'react';
import { useLocation, useNavigation } from 'react-router-dom';

/**
 * After going to another page the focus stands on its heading if what had it is gone, so that keyboard and reader do not
 * begin at the top again.
 */
export function useNavigationFocus(): void {
  const { key } = useLocation();
  const { state } = useNavigation();
  useEffect(() => {
    // The first page keeps the browser's own start.
    if (key === 'default' || state !== 'idle') return;
    const lost = document.activeElement === null || document.activeElement === document.body;
    if (lost) document.querySelector<HTMLElement>('h1[tabindex="-1"]')?.focus({ preventScroll: true });
  }, [key, state]);
}
