import Link from 'next/link';
import type { ReactNode } from 'react';
import { FactList } from '@/components/fact-list';
import { findingActionClass } from '@/components/finding-card';
import { PageHead } from '@/components/page-head';
import type { Site } from '@/lib/domain/site/site';
import { factsOf, partOf, type Fact } from '../facts';
import { partTitles } from '../parts';
import type { Part } from '../schema';
import { followMeanings } from '../words';
import { ContactList } from './contact-list';

type SettingsPageProps = {
  readonly site: Site;
  /** The parts that this person may change; the others are for reading. */
  readonly writable: ReadonlySet<Part>;
  /** What is wrong with the network, drawn with its fixes; null when nothing is. */
  readonly findings: ReactNode;
  readonly panel: ReactNode;
};

type CardProps = { readonly site: Site; readonly part: Part; readonly mayWrite: boolean; readonly children: ReactNode };

function PartCard({ site, part, mayWrite, children }: CardProps) {
  return (
    <section aria-label={partTitles[part]} className="mb-4 grid break-inside-avoid gap-3 rounded-[9px] border border-line bg-raised px-4 pt-3 pb-4">
      <div className="flex min-h-9 items-center justify-between gap-3">
        <h2 className="text-[16px] font-[660]">{partTitles[part]}</h2>
        {mayWrite ? <Link className={findingActionClass} href={`/sites/${site.id}/settings?edit=${part}`} scroll={false} aria-label={`Change: ${partTitles[part].toLowerCase()}`}>Change</Link> : null}
      </div>
      {children}
    </section>
  );
}

const factsOn = <Of extends Part>(part: Of, site: Site): readonly Fact[] => factsOf[part](partOf(part, site), site);

/** Everything said of a site that is no device, menu or plan. */
export function SettingsPage({ site, writable, findings, panel }: SettingsPageProps) {
  const card = (part: Part, children: ReactNode = <FactList facts={factsOn(part, site)} />) => <PartCard site={site} part={part} mayWrite={writable.has(part)}>{children}</PartCard>;
  return (
    <>
      <PageHead title="Site" sub={writable.has('about') ? undefined : 'The network and what hangs on it are yours to change; the rest is the owner’s.'} />
      <div className="columns-1 gap-4 px-4 py-4 md:px-[22px] lg:columns-2 2xl:columns-3">
        {card('network', (
          <>
            {findings === null ? null : <div className="grid gap-2">{findings}</div>}
            <FactList facts={factsOn('network', site).filter(({ label }) => label !== 'Reserved')} />
            <Reserved site={site} />
          </>
        ))}
        {card('link')}
        {card('shared-points', site.sharedPoints.length === 0 ? <Nothing words="No switch, access point or power strip is written down, so the drill cannot try what stops with one." /> : <FactList facts={pointFacts(site)} />)}
        {card('about')}
        {card('follow', <><FactList facts={factsOn('follow', site)} /><Nothing words={followMeanings[site.follows]} /></>)}
        {card('names', <FactList facts={factsOn('names', site).slice(0, 1)} />)}
        {card('courses')}
        {card('contacts', site.contacts.length === 0 ? <Nothing words="Nobody is written down yet. Whoever stands before a dead printer needs a number here." /> : <ContactList contacts={site.contacts} />)}
      </div>
      {panel}
    </>
  );
}

function Nothing({ words }: { readonly words: string }) {
  return <p className="text-[13px] text-soft">{words}</p>;
}

const pointFacts = ({ sharedPoints, printers, tills }: Site): readonly Fact[] => sharedPoints.map(({ id, name }) => {
  const hanging = [...printers, ...tills].filter((device) => device.sharedPoints.includes(id)).map((device) => device.name);
  return { label: name, value: hanging.length === 0 ? 'Nothing hangs on it' : hanging.join(', ') };
});

function Reserved({ site }: { readonly site: Site }) {
  const { reserved } = site.network;
  if (reserved.length === 0) return <Nothing words="No address is reserved." />;
  return (
    <details className="text-[13.5px]">
      <summary className="min-h-9 cursor-pointer content-center font-semibold">{reserved.length} reserved {reserved.length === 1 ? 'address' : 'addresses'}</summary>
      <ul className="grid gap-0.5 pt-1">
        {reserved.map(({ address, reason }) => <li key={address}><span className="font-mono font-semibold">{address}</span> <span className="text-soft">{reason}</span></li>)}
      </ul>
    </details>
  );
}
