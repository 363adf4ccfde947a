import type { ReactNode } from 'react';

const press = 'min-h-9 text-[13px] font-semibold underline underline-offset-3 disabled:no-underline disabled:opacity-40 pointer-coarse:min-h-11';

type ListRowProps = {
  /** What the row is called by those who cannot see it. */
  readonly name: string;
  readonly remove: () => void;
  /** Where the order counts; null at that end of the list. */
  readonly move?: { readonly up: (() => void) | null; readonly down: (() => void) | null };
  readonly children: ReactNode;
};

/** One entry of a list that is edited as a whole. */
export function ListRow({ name, remove, move, children }: ListRowProps) {
  return (
    <fieldset className="grid gap-2 rounded-md border border-line bg-raised p-3">
      <legend className="sr-only">{name}</legend>
      {children}
      <div className="flex flex-wrap gap-x-4">
        {move === undefined ? null : (
          <>
            <button type="button" className={press} disabled={move.up === null} onClick={move.up ?? undefined} aria-label={`Move ${name} up`}>Up</button>
            <button type="button" className={press} disabled={move.down === null} onClick={move.down ?? undefined} aria-label={`Move ${name} down`}>Down</button>
          </>
        )}
        <button type="button" className={`${press} ml-auto`} onClick={remove} aria-label={`Take ${name} off the list`}>Take off</button>
      </div>
    </fieldset>
  );
}
