'use client';

import type { CSSProperties, KeyboardEvent, ReactNode } from 'react';
import { useEffect, useLayoutEffect, useRef, useState } from 'react';
import { createPortal } from 'react-dom';

type BesidePopoverProps = {
  readonly beside: HTMLElement;
  readonly label: string;
  readonly close: () => void;
  readonly children: ReactNode;
};

const widthPx = 268;
const marginPx = 8;

/** Below what was pressed, or above when there is no room; on a phone along the lower edge. */
const placeBeside = (beside: DOMRect, height: number): CSSProperties => {
  if (window.innerWidth < 480) return { left: marginPx, right: marginPx, bottom: marginPx };
  const left = Math.max(marginPx, Math.min(beside.left, window.innerWidth - widthPx - marginPx));
  const below = beside.bottom + 4;
  const top = below + height + marginPx <= window.innerHeight ? below : Math.max(marginPx, beside.top - height - 4);
  return { left, top, width: widthPx };
};

/** A small sheet beside what opened it; Escape or a press elsewhere closes it, the focus goes back where it was. */
export function BesidePopover({ beside, label, close, children }: BesidePopoverProps) {
  const sheet = useRef<HTMLDivElement>(null);
  const [place, setPlace] = useState<CSSProperties>({ left: 0, top: 0, width: widthPx });

  useLayoutEffect(() => {
    const here = (): void => setPlace(placeBeside(beside.getBoundingClientRect(), sheet.current?.offsetHeight ?? 0));
    here();
    window.addEventListener('resize', here);
    return () => window.removeEventListener('resize', here);
  }, [beside]);

  useEffect(() => {
    sheet.current?.querySelector<HTMLElement>('button, input')?.focus();
    const onPress = (event: PointerEvent): void => {
      if (event.target instanceof Node && sheet.current?.contains(event.target) !== true) close();
    };
    document.addEventListener('pointerdown', onPress);
    return () => {
      document.removeEventListener('pointerdown', onPress);
      if (beside.isConnected) beside.focus();
    };
  }, [beside, close]);

  const onKey = (event: KeyboardEvent): void => {
    if (event.key === 'Escape') close();
    if (event.key !== 'Tab') return;
    const stops = [...(sheet.current?.querySelectorAll<HTMLElement>('button, input') ?? [])];
    const edge = event.shiftKey ? stops[0] : stops.at(-1);
    if (document.activeElement !== edge) return;
    event.preventDefault();
    (event.shiftKey ? stops.at(-1) : stops[0])?.focus();
  };

  return createPortal(
    <div
      ref={sheet}
      role="dialog"
      aria-label={label}
      style={place}
      className="fixed z-50 max-h-[calc(100dvh-16px)] overflow-y-auto rounded-lg border border-line-strong bg-raised p-3 text-[14px] shadow-[0_12px_30px_rgba(30,25,10,.25)]"
      onKeyDown={onKey}
    >
      <h2 className="mb-2 font-[660] font-stretch-[106%]">{label}</h2>
      {children}
    </div>,
    document.body,
  );
}
