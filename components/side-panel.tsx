'use client';

import { useEffect, useRef, type ReactNode } from 'react';
import styles from './side-panel.module.css';

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
  /** Asked for again and again, a browser closes a dialog without a question; what was typed has to stay in sight. */
  const closedUnasked = (): void => {
    const sheet = dialog.current;
    if (sheet === null || sheet.open) return;
    leave();
    sheet.showModal();
  };
  return (
    <dialog
      ref={dialog}
      aria-label={title}
      onCancel={(event) => {
        event.preventDefault();
        leave();
      }}
      onClose={closedUnasked}
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || event.defaultPrevented) return;
        event.preventDefault();
        leave();
      }}
      onMouseDown={(event) => {
        if (event.target === dialog.current) leave();
      }}
      className={styles['sheet']}
    >
      <div className={styles['head']}>
        <h2 className="flex-1 text-[19px] font-[680]">{title}</h2>
        <button type="button" onClick={leave} className="min-h-9 rounded-md px-3 text-[13.5px] font-semibold underline underline-offset-3 pointer-coarse:min-h-12">Close</button>
      </div>
      <div className="px-5 py-4">{children}</div>
    </dialog>
  );
}
