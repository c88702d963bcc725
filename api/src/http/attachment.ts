import type { Answer } from './define-route.ts';

const QUOTED = /[^A-Za-z0-9.-]+/g;

/** RFC 8187: percent-encoded UTF-8, with the characters `encodeURIComponent` leaves that a header may not hold. */
const encoded = (name: string): string =>
  encodeURIComponent(name).replace(/['()*]/g, (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`);

/** A file to keep, never to open inside our pages. */
export function attachmentHeaders(name: string): Readonly<Record<string, string>> {
  return {
    'Content-Disposition': `attachment; filename="${name.replace(QUOTED, '-')}"; filename*=UTF-8''${encoded(name)}`,
    'Content-Security-Policy': "sandbox; default-src 'none'",
  };
}

/** A file made for this one request. */
export function attachment(name: string, type: string, bytes: Uint8Array): Answer<undefined> {
  return {
    kind: 'stream',
    headers: { ...attachmentHeaders(name), 'Cache-Control': 'no-store' },
    write: async (_request, response) => {
      response.type(type).send(Buffer.from(bytes));
      await Promise.resolve();
    },
  };
}
