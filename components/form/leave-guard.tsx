import { Button } from '@/components/button';

/** Asked when a form with something typed in it is closed. */
export function LeaveGuard({ stay, leave }: { readonly stay: () => void; readonly leave: () => void }) {
  return (
    <div role="alertdialog" aria-label="Close without saving" className="flex flex-wrap items-center gap-2 rounded-lg border-[1.5px] border-look bg-look-tint p-3 text-[13.5px]">
      <p className="w-full font-semibold">What you typed is not saved.</p>
      <Button kind="primary" autoFocus onClick={stay}>Go on typing</Button>
      <Button onClick={leave}>Close without saving</Button>
    </div>
  );
}
