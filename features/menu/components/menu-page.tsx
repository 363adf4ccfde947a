import Link from 'next/link';
import { buttonClass } from '@/components/button';
import { EmptyState } from '@/components/empty-state';
import { PageHead } from '@/components/page-head';
import { menuFileHref } from '../api/menu';
import type { MenuView } from '../menu-view';
import { MenuTools, SectionsTool } from './menu-loaders';
import { ItemsStatic } from './items-static';
import { MenuEditorLoader } from './menu-editor-loader';

type MenuPageProps = { readonly view: MenuView; readonly mayWrite: boolean };

/** The menu: its sections as slips at the left, the items of one at the right, edited in place. */
export function MenuPage({ view, mayWrite }: MenuPageProps) {
  const { siteId, sections, section, search } = view;
  const total = sections.reduce((sum, one) => sum + one.items, 0);
  return (
    <>
      <PageHead title="Menu" sub={`${total} items in ${sections.length} menu sections.${mayWrite ? '' : ' Only the owner and the chefs change it.'}`}>
        <form role="search" className="flex gap-2">
          <label htmlFor="menu-search" className="sr-only">Search the menu</label>
          <input id="menu-search" name="search" type="search" defaultValue={search} placeholder="Search items" className="min-h-9 w-44 rounded-md border border-line-strong bg-raised px-2.5 text-[14px]" />
        </form>
        <a href={menuFileHref(siteId)} className={buttonClass()} download>Take out as a file</a>
        {mayWrite ? <MenuTools view={view} /> : null}
      </PageHead>
      {sections.length === 0 ? (
        <div className="px-4 py-4 md:px-[22px]"><EmptyState title="No menu yet" words="Bring in the menu as a table that a spreadsheet or the ordering software can save, or write the first menu section by hand. Then hang its sections on stations." /></div>
      ) : (
        <div className="grid grid-cols-[minmax(0,1fr)] gap-4 px-4 py-4 md:grid-cols-[230px_minmax(0,1fr)] md:px-[22px]">
          <nav aria-label="Menu sections" className="min-w-0">
            <ul className="flex gap-1.5 overflow-x-auto pb-2 md:grid md:overflow-visible md:pb-0">
              {sections.map((one) => (
                <li key={one.id} className="shrink-0">
                  <Link
                    href={`/sites/${siteId}/menu?section=${encodeURIComponent(one.id)}`}
                    aria-current={one.id === section?.id ? 'page' : undefined}
                    className={`flex items-baseline justify-between gap-3 rounded-[3px] border px-3 py-2 ${one.id === section?.id ? 'border-ink bg-paper text-paper-ink shadow-[inset_4px_0_0_var(--paper-ink)]' : 'border-paper-edge bg-paper text-paper-ink hover:border-line-strong'}`}
                  >
                    <b className="font-semibold whitespace-nowrap">{one.name}</b><span className="text-[12px] text-paper-quiet">{one.items}</span>
                  </Link>
                </li>
              ))}
            </ul>
            {mayWrite ? <SectionsTool view={view} /> : null}
          </nav>
          <section aria-label={section?.name ?? `Found for ${search}`} className="min-w-0">
            {search === '' ? null : <p className="mb-3 text-soft">{view.items.length === 1 ? '1 item' : `${view.items.length} items`} found for “{search}”. <Link href={`/sites/${siteId}/menu`} className="font-semibold underline underline-offset-3">Show all</Link></p>}
            {mayWrite ? <MenuEditorLoader view={view}><ItemsStatic view={view} /></MenuEditorLoader> : <ItemsStatic view={view} />}
            <p className="mt-4 text-[12.5px] text-quiet">A ticket is an aid: people confirm allergies by voice and by the venue’s own procedure, and local food law decides.</p>
          </section>
        </div>
      )}
    </>
  );
}
