import type { CompiledRule, Context } from '@/lib/domain/routing/compile-plan';
import type { Rule } from '@/lib/domain/site/plan';
import { contextSets, countBits, lowestBit, type ContextSet } from './context-set';
import type { RuleUse, Tie, Way } from './way';

type Count = { won: number; beatenByNarrower: number; beatenByEqual: number };

const newCount = (): Count => ({ won: 0, beatenByNarrower: 0, beatenByEqual: 0 });

/**
 * Decides for all contexts at once which rule wins, and keeps the score of every rule. Contexts are bits, so that a
 * rule costs a few words of arithmetic whatever the number of tills.
 */
export const countRuleUses = (rules: readonly Rule[], contexts: readonly Context[]) => {
  const { words, holdingFor } = contextSets(contexts);
  const counts = rules.map(newCount);
  const sets: (ContextSet | undefined)[] = [];
  const ties = new Map<number, Tie>();
  const setOf = (rule: CompiledRule): ContextSet => (sets[rule.position] ??= holdingFor(rule));

  const noteTies = (winners: readonly (CompiledRule | null)[], loser: CompiledRule, word: number, bits: number, wayAt: (context: number) => Way): void => {
    for (let left = bits; left !== 0; left &= left - 1) {
      const context = word * 32 + lowestBit(left);
      const winner = winners[context];
      if (winner === null || winner === undefined) continue;
      const key = winner.position * rules.length + loser.position;
      if (!ties.has(key)) ties.set(key, { winner: winner.rule, loser: loser.rule, way: wayAt(context) });
    }
  };

  /** @param lists ranked rules of the item, then of its section, then of everything; narrowness never rises */
  const winnersAmong = (lists: readonly (readonly CompiledRule[])[], wayAt: (context: number) => Way): readonly (CompiledRule | null)[] => {
    const winners: (CompiledRule | null)[] = contexts.map(() => null);
    const decided = new Int32Array(words);
    const decidedByEqual = new Int32Array(words);
    let narrowness = -1;
    for (const list of lists) {
      for (const rule of list) {
        const count = counts[rule.position] ?? newCount();
        if (rule.narrowness !== narrowness) {
          decidedByEqual.fill(0);
          narrowness = rule.narrowness;
        }
        const set = setOf(rule);
        for (let word = 0; word < words; word += 1) {
          const holding = set[word] ?? 0;
          if (holding === 0) continue;
          const before = decided[word] ?? 0;
          const equals = decidedByEqual[word] ?? 0;
          const wins = holding & ~before;
          count.won += countBits(wins);
          count.beatenByNarrower += countBits(holding & before & ~equals);
          if ((holding & equals) !== 0) {
            count.beatenByEqual += countBits(holding & equals);
            noteTies(winners, rule, word, holding & equals, wayAt);
          }
          for (let left = wins; left !== 0; left &= left - 1) winners[word * 32 + lowestBit(left)] = rule;
          decided[word] = before | wins;
          decidedByEqual[word] = equals | wins;
        }
      }
    }
    return winners;
  };

  return {
    winnersAmong,
    /** A copy rule that holds somewhere is of use: copies add up and never compete. */
    noteCopy: (rule: CompiledRule): void => {
      const count = counts[rule.position];
      if (count !== undefined) count.won += 1;
    },
    uses: (): readonly RuleUse[] => rules.map((rule, position) => ({ rule, ...(counts[position] ?? newCount()) })),
    ties: (): readonly Tie[] => [...ties.values()],
  };
};

export type RuleScore = ReturnType<typeof countRuleUses>;
