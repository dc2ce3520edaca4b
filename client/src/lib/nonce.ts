/** The value the page's content security policy asks of every style element; the server puts a fresh one in each page. */
export function styleNonce(): string | undefined {
  const meta = document.querySelector<HTMLMetaElement>('meta[property="csp-nonce"]');
  return meta?.nonce || meta?.getAttribute('nonce') || undefined;
}
