import type { Site } from '@/lib/domain/site/site';
import { faultsIn, type Fault } from './references';
import { siteFileSchema, siteFileVersion } from './schema';

export type { Fault } from './references';
export type Reading = { readonly ok: true; readonly site: Site } | { readonly ok: false; readonly faults: readonly Fault[] };

/** A real site is under 2 MB; more than this is another kind of file. */
export const maxCharacters = 10_000_000;
/** The format nests 7 deep; a document nested like a maze is refused before anything walks it. */
export const maxDepth = 32;
const maxFaults = 200;

const refuse = (path: string, message: string): Reading => ({ ok: false, faults: [{ path, message }] });

/** Depth of brackets outside strings; cheap, and safe on a document nested a million deep. */
export const depthOf = (text: string): number => {
  let depth = 0;
  let deepest = 0;
  let inString = false;
  for (let index = 0; index < text.length; index += 1) {
    const code = text.charCodeAt(index);
    if (inString) {
      if (code === 0x5c) index += 1;
      else if (code === 0x22) inString = false;
    } else if (code === 0x22) inString = true;
    else if (code === 0x7b || code === 0x5b) deepest = Math.max(deepest, (depth += 1));
    else if (code === 0x7d || code === 0x5d) depth -= 1;
  }
  return deepest;
};

const pathWords = (path: readonly PropertyKey[]): string =>
  path.map((part, index) => (typeof part === 'number' ? `[${part}]` : `${index === 0 ? '' : '.'}${String(part)}`)).join('');

const parse = (text: string): { readonly value: unknown } | null => {
  try {
    return { value: JSON.parse(text) };
  } catch {
    return null;
  }
};

/**
 * Reads a site file, or says with a path for each fault why it cannot be taken. Nothing half-read is returned.
 *
 * @param text the document, up to `maxCharacters`
 */
export const readSiteFile = (text: string): Reading => {
  if (text.length > maxCharacters) return refuse('', 'The file is larger than 10 MB, which no site needs. Nothing was read.');
  if (depthOf(text) > maxDepth) return refuse('', `The file nests deeper than ${maxDepth} levels, which this format never does. Nothing was read.`);
  const parsed = parse(text.replace(/^\ufeff/, ''));
  if (parsed === null) return refuse('', 'The file is not JSON. Export it again, or mend it in a text editor.');
  const { value } = parsed;
  if (typeof value !== 'object' || value === null || !('tamisSiteFile' in value)) return refuse('tamisSiteFile', 'This is not a site file: it does not say so in “tamisSiteFile”.');
  if (value.tamisSiteFile !== siteFileVersion) return refuse('tamisSiteFile', `The file is of version ${JSON.stringify(value.tamisSiteFile)}, and this program reads version ${siteFileVersion}.`);
  const result = siteFileSchema.safeParse(value);
  if (!result.success) {
    return { ok: false, faults: result.error.issues.slice(0, maxFaults).map((issue) => ({ path: pathWords(issue.path), message: issue.message })) };
  }
  const site = result.data.site as unknown as Site;
  const faults = faultsIn(site);
  return faults.length > 0 ? { ok: false, faults: faults.slice(0, maxFaults) } : { ok: true, site };
};

/** The whole site as one document, ready to be read back to the same value. */
export const writeSiteFile = (site: Site): string => `${JSON.stringify({ tamisSiteFile: siteFileVersion, site }, null, 2)}\n`;
