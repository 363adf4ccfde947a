'use client';

import { useMemo } from 'react';
import type { Difference } from '@/lib/domain/plans/differences';
import { differences } from '@/lib/domain/plans/differences';
import { useBoard, useSettings, useStore } from './board-context';

const none: readonly Difference[] = [];

/** Changes between the live version of this plan and the board; none while another plan is live. */
export const useNotLive = (): readonly Difference[] => {
  const { site } = useStore();
  const { liveContent } = useSettings();
  const content = useBoard((state) => state.content);
  return useMemo(() => (liveContent === null ? none : differences(liveContent, content, site)), [liveContent, content, site]);
};
