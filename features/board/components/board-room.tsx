'use client';

import dynamic from 'next/dynamic';
import type { ReactNode, RefObject } from 'react';
import { useEffect, useRef, useState } from 'react';
import type { BoardSite } from '@/lib/domain/plans/board-site';
import type { ProofSummary } from '@/lib/domain/proof/summary';
import type { PlanContent } from '@/lib/domain/site/plan';
import { createBoardStore } from '../store/create-board-store';
import type { BoardSettings } from './board-context';
import { SettingsContext, StoreContext } from './board-context';
import type { Grab } from './grab';
import type { Opened } from './opened';
import { OpenedContext } from './opened';
import { receiveReading } from '../store/receive-answer';
import { Said } from './said';
import { SaverContext } from './saver-context';
import { useKeptEdits } from './use-kept-edits';
import { usePresence } from './use-presence';
import { useProof } from './use-proof';
import { useUndoKeys } from './use-undo-keys';

const DragLayer = dynamic(() => import('./drag-layer'), { ssr: false });
const loadOpenedLayer = () => import('./opened-layer');
const OpenedLayer = dynamic(loadOpenedLayer, { ssr: false });

type BoardRoomProps = {
  readonly site: BoardSite;
  readonly content: PlanContent;
  readonly version: number;
  readonly proof: ProofSummary;
  readonly settings: BoardSettings;
  readonly children: ReactNode;
};

/** Holds one plan's board: its state, its saving, and what arrives after the first paint. */
export function BoardRoom({ site, content, version, proof, settings, children }: BoardRoomProps) {
  const [store] = useState(() => createBoardStore(site, content, version, proof));
  const [opened, setOpened] = useState<Opened>(null);
  const [opening] = useState(() => ({ open: setOpened, close: () => setOpened(null) }));
  const [painted, setPainted] = useState(false);
  const grabRef: Grab = useRef(null);
  const retryRef = useRef(() => undefined as void);
  const [saver] = useState(() => ({ retry: () => retryRef.current() }));
  useEffect(() => {
    const timer = setTimeout(() => setPainted(true), 0);
    return () => clearTimeout(timer);
  }, []);
  // The list of stations must open with the first press, and also when the network has gone by then.
  useEffect(() => {
    if (painted) void loadOpenedLayer();
  }, [painted]);
  useEffect(() => store.readSite(site), [store, site]);
  useEffect(() => store.set((state) => receiveReading(state, { content, version }, store.site)), [store, content, version]);
  return (
    <StoreContext value={store}>
      <SettingsContext value={settings}>
        <SaverContext value={saver}>
        <OpenedContext value={opening}>
          <BoardHands retryRef={retryRef} proof={proof} proven={content} />
          {/* Presses bubble here from the cards, which are themselves buttons: nothing is hidden from the keyboard. */}
          <div onMouseDown={(event) => grabRef.current?.(event)} onTouchStart={(event) => grabRef.current?.(event)}>{children}</div>
          <Said />
          {painted && settings.mayWrite ? <DragLayer grabRef={grabRef} /> : null}
          {opened === null ? null : <OpenedLayer opened={opened} close={opening.close} />}
        </OpenedContext>
        </SaverContext>
      </SettingsContext>
    </StoreContext>
  );
}

type BoardHandsProps = { readonly retryRef: RefObject<() => void>; readonly proof: ProofSummary; readonly proven: PlanContent };

/** What works in the background: saving, who else is here, the proof, the keys for Undo. Draws nothing. */
function BoardHands({ retryRef, proof, proven }: BoardHandsProps) {
  useKeptEdits(retryRef);
  usePresence();
  useUndoKeys();
  useProof(proof, proven);
  return null;
}
