'use client';

import { useRouter } from 'next/navigation';
import type { Fix } from '@/lib/domain/findings/finding';
import { asId } from '@/lib/domain/site/ids';
import { anyCondition } from '@/lib/domain/site/plan';
import { applyFix } from '../api/apply-fix';
import { useSettings, useStore } from './board-context';
import { useMakeEdit } from './use-make-edit';

/** How a fix is pressed home; what this person's role may not mend is not offered as a button. */
export type Fixing = {
  readonly canFix: (fix: Fix) => boolean;
  readonly apply: (fix: Fix) => void;
};

/** Fixes of the plan are edits on the board, with Undo; the others are made on the server and the page is read again. */
export const useFix = (): Fixing => {
  const { siteId, mayFix } = useSettings();
  const store = useStore();
  const make = useMakeEdit();
  const router = useRouter();

  const applyElsewhere = async (fix: Fix): Promise<void> => {
    const answer = await applyFix(siteId, fix);
    const words = answer.kind === 'done' ? `${fix.label}: done` : answer.words;
    store.set((state) => ({
      ...state, notice: { id: (state.notice?.id ?? 0) + 1, words, offers: 'nothing' }, said: { id: state.said.id + 1, words },
    }));
    if (answer.kind === 'done') router.refresh();
  };

  const apply = (fix: Fix): void => {
    if (fix.kind === 'send-sections') {
      make({ kind: 'send', targets: fix.sections.map((section) => ({ kind: 'section', section: asId(section) })), conditions: anyCondition, how: 'replace', stations: fix.stations.map((station) => asId(station)) });
    } else if (fix.kind === 'remove-rule') make({ kind: 'remove-rules', rules: [asId(fix.rule)] });
    else void applyElsewhere(fix);
  };

  return { canFix: (fix) => mayFix.includes(fix.kind), apply };
};
