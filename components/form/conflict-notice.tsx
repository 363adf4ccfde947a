import { Button } from '@/components/button';

type ConflictNoticeProps = {
  /** Who saved in between, in words ("Femi Lindqvist changed this ..."). */
  readonly words: string;
  readonly differences: readonly { readonly label: string; readonly from: string; readonly to: string }[];
  readonly keepMine: () => void;
  readonly takeTheirs: () => void;
};

/** Somebody else saved the same thing: what changed, and a choice that loses nothing unseen. */
export function ConflictNotice({ words, differences, keepMine, takeTheirs }: ConflictNoticeProps) {
  return (
    <div role="alert" className="grid gap-2 rounded-lg border-[1.5px] border-look bg-look-tint p-3 text-[13.5px]">
      <p className="font-semibold">{words}</p>
      {differences.length === 0 ? null : (
        <ul className="grid gap-0.5">
          {differences.map(({ label, from, to }) => <li key={label}>{label}: {from} is now <b>{to}</b></li>)}
        </ul>
      )}
      <div className="flex flex-wrap gap-2">
        <Button kind="primary" onClick={keepMine}>Save what I typed as well</Button>
        <Button onClick={takeTheirs}>Drop what I typed</Button>
      </div>
    </div>
  );
}
