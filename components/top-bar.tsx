import Link from 'next/link';
import { MeshMark } from './mesh-mark';

export type LiveWords = { readonly plan: string; readonly inForce: string; readonly everywhere: boolean };

type TopBarProps = {
  readonly site?: { readonly name: string; readonly place: string } | undefined;
  readonly live?: LiveWords | null | undefined;
  readonly person: { readonly name: string; readonly title: string };
  /** Where a chosen light comes back to. */
  readonly back: string;
  readonly manySites: boolean;
};

const menuItem = 'block w-full rounded px-3 py-2 text-left text-[13.5px] hover:bg-ground pointer-coarse:min-h-11';

const lights = [['system', 'As the system'], ['light', 'Light'], ['low', 'Low light']] as const;

/** What is live, where, and who is signed in; it never changes with what is being edited below. */
export function TopBar({ site, live, person, back, manySites }: TopBarProps) {
  return (
    <div className="flex min-h-[54px] flex-wrap items-center gap-x-4 gap-y-1 bg-night px-4 py-2 text-[13.5px] text-on-night md:px-[22px]">
      <Link href="/sites" className="flex items-center gap-[9px] text-[20px] font-[650] tracking-[-0.01em] font-stretch-[118%]"><MeshMark /> Tamis</Link>
      {site === undefined ? null : <p className="min-w-0 flex-1 truncate border-l border-line-on-night pl-3 text-quiet-on-night sm:flex-none sm:pl-4"><b className="text-on-night">{site.name}</b><span className="hidden sm:inline">{site.place === '' ? '' : `, ${site.place}`}</span></p>}
      <div className="hidden flex-1 sm:block" />
      {live === undefined ? null : (
        <p className="order-last w-full text-quiet-on-night sm:order-none sm:w-auto">
          <i aria-hidden className={`mr-2 inline-block size-2 rounded-full ${live === null ? 'bg-quiet' : live.everywhere ? 'bg-[#7cc79c]' : 'bg-[#e3b75a]'}`} />
          {live === null ? 'No plan is live' : <><b className="text-on-night">{live.plan}</b> is live, {live.inForce}</>}
        </p>
      )}
      <details name="person" className="group relative sm:border-l sm:border-line-on-night sm:pl-4">
        <summary className="flex min-h-9 list-none items-center gap-1.5 text-quiet-on-night [&::-webkit-details-marker]:hidden">
          <span><b className="text-on-night"><span className="hidden sm:inline">{person.name}</span><span className="sm:hidden">{person.name.split(' ')[0]}</span></b><span className="hidden sm:inline">{person.title === '' ? '' : `, ${person.title}`}</span></span>
          <svg width="10" height="6" viewBox="0 0 10 6" aria-hidden><path d="M1 1l4 4 4-4" fill="none" stroke="currentColor" strokeWidth="1.5" /></svg>
        </summary>
        <div className="absolute right-0 z-40 mt-1 w-56 rounded-lg border border-line bg-raised p-1.5 text-ink shadow-xl">
          {manySites ? <Link href="/sites" className={menuItem}>My sites</Link> : null}
          <Link href="/account" className={menuItem}>Change my password</Link>
          <form action="/api/account/light" method="post" className="my-1 border-y border-line py-1">
            <input type="hidden" name="back" value={back} />
            {lights.map(([value, words]) => <button key={value} name="light" value={value} className={menuItem}>{words}</button>)}
          </form>
          <form action="/api/account/sign-out" method="post"><button className={`${menuItem} font-semibold`}>Sign out</button></form>
        </div>
      </details>
    </div>
  );
}
