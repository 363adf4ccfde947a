'use client';

import { useEffect, useRef } from 'react';
import type { CollisionDetection, DragEndEvent, DragStartEvent } from '@dnd-kit/core';
import { DndContext, DragOverlay, MouseSensor, pointerWithin, TouchSensor, useDraggable, useDroppable, useSensor, useSensors } from '@dnd-kit/core';
import type { DropPlace } from '@/lib/domain/plans/drop';
import { cancelLift, cardsNamed, choose, drop, dropPlaces, lift, moveOver, placeOf } from '../store/lift';
import { newRuleId, useBoard, useStore } from './board-context';
import type { Grab } from './grab';
import { LiftedPaper } from './lifted-paper';

/** The board says in its own words what happens; the library's live region would speak over it. */
const quiet = {
  announcements: { onDragStart: () => undefined, onDragOver: () => undefined, onDragEnd: () => undefined, onDragCancel: () => undefined },
  screenReaderInstructions: { draggable: '' },
};

const railUnderPointer: CollisionDetection = (event) => pointerWithin(event).slice(0, 1);

function DropZone({ place }: { readonly place: DropPlace }) {
  const { setNodeRef } = useDroppable({ id: place });
  useEffect(() => {
    setNodeRef(document.querySelector<HTMLElement>(`[data-place="${CSS.escape(place)}"]`));
    return () => setNodeRef(null);
  }, [place, setNodeRef]);
  return null;
}

/**
 * One draggable for all cards: it takes the shape of whichever card is pressed. Hundreds of cards thus cost nothing
 * while one of them moves.
 */
function Grabbed({ grabRef }: { readonly grabRef: Grab }) {
  const { setNodeRef, listeners } = useDraggable({ id: 'grabbed', data: { card: '' } });
  useEffect(() => {
    grabRef.current = (event) => {
      const paper = event.target instanceof Element ? event.target.closest<HTMLElement>('[data-card]') : null;
      if (paper === null || (event.target as Element).closest('[data-no-drag]') !== null) return;
      setNodeRef(paper);
      listeners?.[event.type === 'touchstart' ? 'onTouchStart' : 'onMouseDown']?.(event);
    };
    return () => {
      grabRef.current = null;
    };
  }, [grabRef, listeners, setNodeRef]);
  return null;
}

/** Drag by mouse and touch. Loaded after the first paint: the board is whole without it. */
export default function DragLayer({ grabRef }: { readonly grabRef: Grab }) {
  const store = useStore();
  const lifted = useBoard((state) => (state.lifted?.by === 'pointer' ? state.lifted : null));
  const pressed = useRef<string | null>(null);
  const sensors = useSensors(
    useSensor(MouseSensor, { activationConstraint: { distance: 5 } }),
    useSensor(TouchSensor, { activationConstraint: { delay: 250, tolerance: 5 } }),
  );

  const start = ({ activatorEvent }: DragStartEvent): void => {
    const paper = activatorEvent.target instanceof Element ? activatorEvent.target.closest<HTMLElement>('[data-card]') : null;
    pressed.current = paper?.dataset['card'] ?? null;
    const card = pressed.current;
    if (card !== null) store.set((state) => lift(state, card, 'pointer', store.site));
  };

  const end = ({ activatorEvent, over }: DragEndEvent): void => {
    const card = pressed.current;
    const [held] = card === null ? [] : cardsNamed(store.get(), [card]);
    const stayed = held !== undefined && over?.id === placeOf(held);
    // Held and let go where it was: on a touch screen that chooses the card, and a tap adds the next.
    if (stayed && card !== null && activatorEvent.type === 'touchstart') store.set((state) => choose(cancelLift(state), card));
    else drop(store, newRuleId);
    pressed.current = null;
  };

  return (
    <DndContext
      id="board"
      sensors={sensors}
      collisionDetection={railUnderPointer}
      accessibility={quiet}
      onDragStart={start}
      onDragOver={({ over }) => store.set((state) => moveOver(state, (over?.id as DropPlace | undefined) ?? null, store.site))}
      onDragEnd={end}
      onDragCancel={() => store.set(cancelLift)}
    >
      {dropPlaces(store.site).map((place) => <DropZone key={place} place={place} />)}
      <Grabbed grabRef={grabRef} />
      <DragOverlay dropAnimation={null} zIndex={40}>
        {lifted === null ? null : <LiftedPaper cards={lifted.cards} />}
      </DragOverlay>
    </DndContext>
  );
}
