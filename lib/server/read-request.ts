import 'server-only';
import { AppError } from '@/lib/http/errors';

/** A write must come from our own pages: browsers say so in Sec-Fetch-Site, older ones in Origin. */
export const mustBeSameOrigin = (request: Request): void => {
  const site = request.headers.get('sec-fetch-site');
  const origin = request.headers.get('origin');
  const host = request.headers.get('host') ?? new URL(request.url).host;
  const sameSite = site === null || site === 'same-origin' || site === 'none';
  const sameHost = origin === null || (URL.canParse(origin) && new URL(origin).host === host);
  if (sameSite && sameHost && (site !== null || origin !== null)) return;
  throw new AppError('wrong-origin', 'This request did not come from a page of Tamis, so nothing was done. Open the page and use its own buttons.');
};

/** The version of If-Match, a strong tag as in RFC 9110 section 13.1.1. */
export const readVersion = (request: Request): number => {
  const tag = request.headers.get('if-match');
  if (tag === null) throw new AppError('version-missing', 'The request does not say which version it changes, so nothing was changed. Reload the page, then try again.');
  const match = /^"(\d{1,15})"$/.exec(tag.trim());
  if (match === null) throw new AppError('invalid', 'The version in If-Match cannot be read, so nothing was changed. Reload the page, then try again.');
  return Number(match[1]);
};

type Limits = { readonly json: boolean; readonly maxBytes: number; readonly types: readonly string[] };

const tooLarge = (maxBytes: number): AppError =>
  new AppError('too-large', `That is more than ${maxBytes >= 1_000_000 ? `${Math.floor(maxBytes / 1_000_000)} MB` : `${Math.floor(maxBytes / 1_000)} kB`}, which is not taken. Nothing was changed. Send less at a time.`);

/** Reads no more than is allowed, whatever the request says of its own length. */
const readBytes = async (request: Request, maxBytes: number): Promise<Uint8Array> => {
  if (Number(request.headers.get('content-length') ?? 0) > maxBytes) throw tooLarge(maxBytes);
  const chunks: Uint8Array[] = [];
  let size = 0;
  if (request.body === null) return new Uint8Array();
  const reader = request.body.getReader();
  for (;;) {
    const { done, value } = await reader.read();
    if (done) break;
    size += value.byteLength;
    if (size > maxBytes) {
      await reader.cancel();
      throw tooLarge(maxBytes);
    }
    chunks.push(value);
  }
  return Buffer.concat(chunks);
};

export const readBody = async (request: Request, { json, maxBytes, types }: Limits): Promise<{ readonly json: unknown; readonly bytes: Uint8Array; readonly type: string }> => {
  const type = (request.headers.get('content-type') ?? '').split(';')[0]?.trim().toLowerCase() ?? '';
  const allowed = json ? ['application/json'] : types;
  if (!allowed.includes(type)) throw new AppError('wrong-type', `This takes ${allowed.join(' or ')}, not ${type === '' ? 'something unnamed' : type}. Nothing was changed.`);
  const bytes = await readBytes(request, maxBytes);
  if (!json) return { json: undefined, bytes, type };
  try {
    return { json: JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes)), bytes, type };
  } catch {
    throw new AppError('invalid', 'What was sent is not JSON, so nothing was changed.');
  }
};

/** What a plain form of ours sends: a few short fields. */
export const readForm = async (request: Request): Promise<URLSearchParams> => {
  const { bytes } = await readBody(request, { json: false, maxBytes: 10_000, types: ['application/x-www-form-urlencoded'] });
  return new URLSearchParams(new TextDecoder().decode(bytes));
};
