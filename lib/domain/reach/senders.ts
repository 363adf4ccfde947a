import type { TillId } from '../site/ids';
import type { Site } from '../site/site';
import type { Till } from '../site/till';

/** The device whose network connection a till's tickets leave from. */
export type Sender =
  | { readonly kind: 'till'; readonly till: Till; readonly via: TillId | null }
  | { readonly kind: 'link'; readonly address: string; readonly mask: string }
  | { readonly kind: 'none'; readonly why: string };

export type SenderSite = Pick<Site, 'tills' | 'link'>;

/** Follows "prints through" and the print link to the device that sends; a circle or a till that is off ends it. */
export const findSender = (site: SenderSite, start: Till, offTills: ReadonlySet<TillId>): Sender => {
  const tills = new Map(site.tills.map((till) => [till.id, till]));
  const seen = new Set<TillId>();
  let till = start;
  for (;;) {
    if (offTills.has(till.id)) return { kind: 'none', why: till.id === start.id ? `${start.name} is off.` : `${start.name} prints through ${till.name}, which is off.` };
    if (seen.has(till.id)) return { kind: 'none', why: `${start.name} prints through other tills in a circle, so no till prints.` };
    seen.add(till.id);
    const next = nextSender(site, till);
    if (next === 'itself') return { kind: 'till', till, via: till.id === start.id ? null : till.id };
    if (typeof next !== 'string') return next;
    const through = tills.get(next);
    if (through === undefined) return { kind: 'none', why: `${till.name} prints through a till that is no longer there.` };
    till = through;
  }
};

const nextSender = (site: SenderSite, till: Till): 'itself' | TillId | Exclude<Sender, { kind: 'till' }> => {
  if (till.kind !== 'online') return till.printsThrough ?? 'itself';
  switch (site.link.kind) {
    case 'none': return { kind: 'none', why: `${till.name} needs the print link, and this site has none.` };
    case 'till': return site.link.till;
    case 'own': return { kind: 'link', address: site.link.address, mask: site.link.mask };
  }
};
