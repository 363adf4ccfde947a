import type { MouseEvent, RefObject, TouchEvent } from 'react';

/** Filled by the drag layer once it has arrived; until then a press on a card lifts nothing. */
export type Grab = RefObject<((event: MouseEvent | TouchEvent) => void) | null>;
