/**
 * Sets the colour scheme before anything is drawn, so that a dark page does not begin with a light one.
 * The theme provider keeps it from then on, under the same key.
 */
export function setFirstScheme(): void {
  let chosen: string | null = null;
  try {
    chosen = localStorage.getItem('scheme');
  } catch {
    // A browser that keeps nothing follows the system.
  }
  const dark = chosen === 'dark' || (chosen !== 'light' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.dataset.scheme = dark ? 'dark' : 'light';
}
