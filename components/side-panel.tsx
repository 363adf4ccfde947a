'use client';

import { useEffect, useRef, type ReactNode } from 'react';

type SidePanelProps = {
  readonly title: string;
  readonly close: () => void;
  /** Asked before closing; false keeps it open, for words that were typed and not saved. */
  readonly mayClose?: () => boolean;
  readonly children: ReactNode;
};

/** A sheet from the right, the whole screen on a phone. Focus goes in, stays in, and back where it came from. */
export function SidePanel({ title, close, mayClose = () => true, children }: SidePanelProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const sheet = dialog.current;
    const before = document.activeElement;
    if (sheet !== null && !sheet.open) sheet.showModal();
    return () => {
      sheet?.close();
      if (before instanceof HTMLElement && before.isConnected) before.focus();
    };
  }, []);
  const leave = (): void => {
    if (mayClose()) close();
  };
  return (
    <dialog
      ref={dialog}
      aria-label={title}
      onCancel={(event) => {
        event.preventDefault();
        leave();
      }}
      onMouseDown={(event) => {
        if (event.target === dialog.current) leave();
      }}
      className="fixed inset-y-0 right-0 left-auto m-0 h-dvh max-h-none w-full max-w-[560px] overflow-y-auto overscroll-contain border-l border-line bg-panel p-0 text-ink shadow-2xl backdrop:bg-veil"
    >
      <div className="sticky top-0 z-10 flex min-h-14 items-center gap-3 border-b border-line bg-panel px-5 py-2.5">
        <h2 className="flex-1 text-[19px] font-[680]">{title}</h2>
        <button type="button" onClick={leave} className="min-h-9 rounded-md px-3 text-[13.5px] font-semibold underline underline-offset-3 pointer-coarse:min-h-11">Close</button>
      </div>
      <div className="px-5 py-4">{children}</div>
    </dialog>
  );
}
