/**
 * A JSON answer that the browser keeps and asks about again: 304 while its tag is still right, so that polling something
 * large costs nothing until it changes.
 */
export function taggedJson(request: Request, tag: string, text: () => string): Response {
  const etag = `W/"${tag}"`;
  const headers = { etag, 'cache-control': 'private, no-cache', vary: 'cookie' };
  const known = request.headers.get('if-none-match');
  if (known?.split(',').some((candidate) => candidate.trim() === etag)) {
    return new Response(null, { status: 304, headers });
  }
  return new Response(text(), { headers: { ...headers, 'content-type': 'application/json' } });
}
