import Link from 'next/link';
import type { ReactNode } from 'react';
import { MeshMark } from './mesh-mark';

type TopBarProps = {
  /** Where the mark leads; null where there is nowhere to go yet. */
  readonly home: string | null;
  readonly site?: { readonly name: string; readonly place: string };
  /** What stands at the right: what is live, who is signed in. */
  readonly children?: ReactNode;
};

const brand = 'flex min-h-9 items-center gap-[9px] text-[20px] leading-none font-[650] tracking-[-0.01em] font-stretch-[118%]';

/** The dark bar above every page: the house's mark, the site, and what does not change with what is edited below. */
export function TopBar({ home, site, children }: TopBarProps) {
  return (
    <div className="flex min-h-[54px] flex-wrap items-center gap-x-4 gap-y-0.5 bg-night px-4 py-1.5 text-[13.5px] text-on-night [--focus:#fff] md:px-[22px]">
      {home === null ? <p className={brand}><MeshMark /> Tamis</p> : <Link href={home} className={brand}><MeshMark /> Tamis</Link>}
      {site === undefined ? null : (
        <p className="min-w-0 flex-1 truncate border-l border-line-on-night pl-3 text-quiet-on-night sm:flex-none sm:pl-4">
          <b className="text-on-night">{site.name}</b>
          {site.place === '' ? null : <span className="hidden sm:inline">, {site.place}</span>}
        </p>
      )}
      <div className={site === undefined ? 'flex-1' : 'hidden flex-1 sm:block'} />
      {children}
    </div>
  );
}
