'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { useEffect, useRef } from 'react';
import { hrefOf, type PageLink } from '@/lib/navigation';
import { Rail } from './rail';

type RailNavProps = { readonly siteId: string; readonly links: readonly PageLink[] };

const here = 'h-[45px] border-paper-edge bg-paper pt-[18px] font-[660] text-paper-ink shadow-[0_2px_4px_rgb(40_35_20/0.16)]';
const elsewhere = 'h-[37px] border-line bg-panel pt-[15px] text-soft shadow-[0_1px_1px_rgb(40_35_20/0.08)] hover:text-ink pointer-coarse:h-[42px]';

/** The pages of a site, hanging from a rail; where the rail is longer than the screen, the page that is open is brought into sight. */
export function RailNav({ siteId, links }: RailNavProps) {
  const path = usePathname();
  const list = useRef<HTMLUListElement>(null);
  useEffect(() => {
    const open = list.current?.querySelector('[aria-current]')?.parentElement;
    if (list.current === null || !open) return;
    list.current.scrollLeft = open.offsetLeft - (list.current.clientWidth - open.offsetWidth) / 2;
  }, [path]);
  return (
    <nav aria-label="Pages" className="relative z-10">
      <Rail className="absolute inset-x-0 top-0 z-10" />
      <ul ref={list} className="relative flex h-[50px] gap-1.5 overflow-x-auto overflow-y-hidden px-4 [scrollbar-width:none] md:px-[22px]">
        {links.map((link) => {
          const href = hrefOf(link, siteId);
          const isOpen = path === href || (href.startsWith(`/sites/${siteId}/`) && path.startsWith(`${href}/`));
          return (
            <li key={href} className="shrink-0">
              <Link href={href} aria-current={isOpen ? 'page' : undefined} className={`block rounded-b border border-t-0 px-[15px] text-[13.5px] whitespace-nowrap ${isOpen ? here : elsewhere}`}>
                {link.name}
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
