import { request as httpRequest } from 'node:http';
import { request as httpsRequest } from 'node:https';

export type PostResult = { readonly status: number } | { readonly fault: string };

/** Posts a body and tells the status of the answer, or why there was none. Redirects are not followed. */
export function postBody(
  url: string,
  body: string,
  headers: Readonly<Record<string, string>>,
  limitMilliseconds: number,
  signal: AbortSignal,
): Promise<PostResult> {
  return new Promise((resolve) => {
    const send = url.startsWith('https:') ? httpsRequest : httpRequest;
    const request = send(
      url,
      {
        method: 'POST',
        agent: false,
        headers: { ...headers, 'content-length': String(Buffer.byteLength(body)) },
        signal,
        timeout: limitMilliseconds,
      },
      (response) => {
        response.resume();
        response.on('end', () => resolve({ status: response.statusCode ?? 0 }));
        response.on('error', (fault) => resolve({ fault: fault.message }));
      },
    );
    request.on('timeout', () => request.destroy(new Error(`no answer within ${limitMilliseconds} ms`)));
    request.on('error', (fault) => resolve({ fault: fault.message }));
    request.end(body);
  });
}
