import Link from 'next/link';
import { HereField } from './here-field';

export type Light = 'system' | 'light' | 'low';

type PersonMenuProps = {
  readonly person: { readonly name: string; readonly title: string };
  readonly light: Light;
  readonly manySites: boolean;
};

const entry = 'flex min-h-9 w-full items-center gap-2 rounded px-3 py-1.5 text-left text-[13.5px] hover:bg-ground pointer-coarse:min-h-12';

const lights: readonly (readonly [Light, string])[] = [['system', 'As this device is set'], ['light', 'Light'], ['low', 'Low light, for dim rooms']];

/** Who is signed in, and what is theirs alone. Opens, closes and submits without any script. */
export function PersonMenu({ person, light, manySites }: PersonMenuProps) {
  const [given, ...rest] = person.name.split(' ');
  return (
    <div className="sm:border-l sm:border-line-on-night sm:pl-4">
      <button type="button" popoverTarget="person-menu" className="flex min-h-9 items-center gap-1.5 text-quiet-on-night pointer-coarse:min-h-11">
        <span>
          <b className="text-on-night">{given} <span className="hidden sm:inline">{rest.join(' ')}</span></b>
          {person.title === '' ? null : <span className="hidden sm:inline">, {person.title}</span>}
        </span>
        <svg width="10" height="6" viewBox="0 0 10 6" aria-hidden><path d="M1 1l4 4 4-4" fill="none" stroke="currentColor" strokeWidth="1.5" /></svg>
      </button>
      <div id="person-menu" popover="auto" className="fixed inset-auto top-[50px] right-3 m-0 w-64 rounded-lg border border-line bg-raised p-1.5 text-ink shadow-xl [--focus:var(--ink)] md:right-[18px]">
        {manySites ? <Link href="/sites" className={entry}>My sites</Link> : null}
        <Link href="/account" className={entry}>Change my password</Link>
        <form action="/api/account/light" method="post" className="my-1 border-y border-line py-1">
          <HereField name="back" />
          {lights.map(([value, words]) => (
            <button key={value} name="light" value={value} aria-pressed={value === light} className={entry}>
              <svg width="12" height="10" viewBox="0 0 12 10" aria-hidden className={value === light ? '' : 'invisible'}><path d="M1 5l3.5 3.5L11 1" fill="none" stroke="currentColor" strokeWidth="1.8" /></svg>
              {words}
            </button>
          ))}
        </form>
        <form action="/api/account/sign-out" method="post"><button className={`${entry} font-semibold`}>Sign out</button></form>
      </div>
    </div>
  );
}
