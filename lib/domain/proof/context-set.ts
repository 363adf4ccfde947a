import type { CompiledRule, Context } from '@/lib/domain/routing/compile-plan';

/** A set of contexts, one bit each in the order of the contexts; 32 to a word. */
export type ContextSet = Int32Array;

const setBit = (set: ContextSet, index: number): void => {
  set[index >> 5] = (set[index >> 5] ?? 0) | (1 << (index & 31));
};

const collect = <Key>(contexts: readonly Context[], words: number, keyOf: (context: Context) => Key): ReadonlyMap<Key, ContextSet> => {
  const sets = new Map<Key, ContextSet>();
  contexts.forEach((context, index) => {
    const key = keyOf(context);
    const set = sets.get(key) ?? new Int32Array(words);
    setBit(set, index);
    sets.set(key, set);
  });
  return sets;
};

/** Keeps in `set` only what belongs to one of the named keys. */
const narrow = <Key>(set: ContextSet, named: ReadonlySet<Key> | null, sets: ReadonlyMap<Key, ContextSet>): void => {
  if (named === null) return;
  for (let word = 0; word < set.length; word += 1) {
    let allowed = 0;
    for (const key of named) allowed |= sets.get(key)?.[word] ?? 0;
    set[word] = (set[word] ?? 0) & allowed;
  }
};

/** Answers for any rule in which contexts its conditions hold, all contexts at once. */
export const contextSets = (contexts: readonly Context[]) => {
  const words = Math.max(1, Math.ceil(contexts.length / 32));
  const all = new Int32Array(words);
  contexts.forEach((_, index) => setBit(all, index));
  const byTill = collect(contexts, words, (context) => context.till);
  const byArea = collect(contexts, words, (context) => context.area);
  const byOrderType = collect(contexts, words, (context) => context.orderType);
  return {
    words,
    holdingFor: (rule: CompiledRule): ContextSet => {
      const set = all.slice();
      narrow(set, rule.tills, byTill);
      narrow(set, rule.areas, byArea);
      narrow(set, rule.orderTypes, byOrderType);
      return set;
    },
  };
};

/** How many of 32 bits are set. */
export const countBits = (word: number): number => {
  let bits = word - ((word >>> 1) & 0x55555555);
  bits = (bits & 0x33333333) + ((bits >>> 2) & 0x33333333);
  return Math.imul((bits + (bits >>> 4)) & 0x0f0f0f0f, 0x01010101) >>> 24;
};

/** The place of the lowest bit set in a word that is not zero. */
export const lowestBit = (word: number): number => 31 - Math.clz32(word & -word);
