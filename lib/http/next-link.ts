/** `Link: <…>; rel="next"` (RFC 8288) for a list that goes on. */
export function nextLink(request: Request, next: string | null): Record<string, string> {
  if (!next) return {};
  const url = new URL(request.url);
  url.searchParams.set('after', next);
  return { link: `<${url.pathname}${url.search}>; rel="next"` };
}
