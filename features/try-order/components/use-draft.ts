'use client';

import { useEffect, useState } from 'react';
import { emptyOrder } from '@/lib/domain/orders/edit-order';
import type { Order } from '@/lib/domain/orders/order';
import type { Site } from '@/lib/domain/site/site';
import { linkedDraft } from '../linked-draft';
import { planOfKey, type PlanChoice } from '../plan-choices';
import { draftSchema, type Draft } from '../schema';

const keyOf = (site: Site): string => `tamis.try.${site.id}`;

const freshDraft = (site: Site, choices: readonly PlanChoice[]): Draft | null => {
  const [first] = choices;
  return first === undefined ? null : { plan: first.key, present: 'planned', order: emptyOrder(site) };
};

/** What this browser kept, if it still reads as a draft of a plan and a till that exist. */
const keptDraft = (site: Site, choices: readonly PlanChoice[]): Draft | null => {
  try {
    const kept = draftSchema.safeParse(JSON.parse(sessionStorage.getItem(keyOf(site)) ?? 'null'));
    const stands = kept.success && planOfKey(choices, kept.data.plan) !== null && site.tills.some(({ id }) => id === kept.data.order.till);
    return stands ? kept.data : null;
  } catch {
    return null;
  }
};

/** The order being written: kept over a reload, and the one before it can be brought back. */
export const useDraft = (site: Site, choices: readonly PlanChoice[]) => {
  const [draft, setDraft] = useState<Draft | null>(() => {
    const kept = keptDraft(site, choices);
    return linkedDraft(site, choices, kept, new URLSearchParams(location.search)) ?? kept ?? freshDraft(site, choices);
  });
  const [before, setBefore] = useState<Order | null>(null);
  // A reload goes on with what was written since, not with the link again.
  useEffect(() => {
    if (location.search !== '') history.replaceState(history.state, '', location.pathname);
  }, []);
  useEffect(() => {
    if (draft === null) return;
    try {
      sessionStorage.setItem(keyOf(site), JSON.stringify(draft));
    } catch {
      // A browser that keeps nothing still lets the order be tried.
    }
  }, [site, draft]);
  const change = (part: Partial<Draft>): void => setDraft((now) => (now === null ? null : { ...now, ...part }));
  const setOrder = (edit: (order: Order) => Order): void => setDraft((now) => (now === null ? null : { ...now, order: edit(now.order) }));
  const replaceOrder = (order: Order): void => {
    setBefore(draft === null || draft.order.lines.length === 0 ? null : draft.order);
    change({ order });
  };
  return { draft, before, change, setOrder, replaceOrder };
};

export type DraftControl = ReturnType<typeof useDraft>;
