'use client';

import { createContext, useContext } from 'react';

/** Lets a person try a save again at once. */
export type SaverHandle = { readonly retry: () => void };

export const SaverContext = createContext<SaverHandle>({ retry: () => undefined });

export const useSaver = (): SaverHandle => useContext(SaverContext);
