'use client';

import { createContext, useContext } from 'react';

/** What a person has opened beside the board; one thing at a time. */
export type Opened =
  | { readonly kind: 'card'; readonly card: string }
  | { readonly kind: 'send'; readonly cards: readonly string[]; readonly beside: HTMLElement }
  | { readonly kind: 'rules' }
  | { readonly kind: 'changes' }
  | { readonly kind: 'plans' }
  | null;

export type OpenedContextValue = { readonly open: (opened: Opened) => void };

/** The function alone, so that opening something draws nothing but what opens. */
export const OpenedContext = createContext<OpenedContextValue>({ open: () => undefined });

export const useOpened = (): OpenedContextValue => useContext(OpenedContext);
