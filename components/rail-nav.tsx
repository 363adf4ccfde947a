'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import type { PageLink } from '@/lib/navigation';

type RailNavProps = { readonly siteId: string; readonly links: readonly PageLink[] };

/** The pages of a site, hanging from a rail; on a narrow screen the rail is longer than the screen. */
export function RailNav({ siteId, links }: RailNavProps) {
  const path = usePathname();
  return (
    <nav aria-label="Pages" className="relative z-10">
      <div aria-hidden className="absolute inset-x-0 top-0 z-10 h-[11px] shadow-[0_1px_2px_rgb(0_0_0/0.2)]" style={{ background: 'var(--rail)' }} />
      <ul className="flex h-[50px] gap-1.5 overflow-x-auto overflow-y-hidden px-4 [scrollbar-width:none] md:px-[22px]">
        {links.map(({ name, path: last }) => {
          const href = `/sites/${siteId}/${last}`;
          const here = path === href || path.startsWith(`${href}/`);
          return (
            <li key={last} className="shrink-0">
              <Link
                href={href}
                aria-current={here ? 'page' : undefined}
                className={`block rounded-b border border-t-0 px-[15px] text-[13.5px] whitespace-nowrap ${here
                  ? 'h-[45px] border-paper-edge bg-paper pt-[18px] font-[660] text-paper-ink shadow-[0_2px_4px_rgb(40_35_20/0.16)]'
                  : 'h-[37px] border-line bg-panel pt-[15px] text-soft shadow-[0_1px_1px_rgb(40_35_20/0.08)] hover:text-ink'}`}
              >
                {name}
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
