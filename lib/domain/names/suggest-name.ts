import type { NamingPolicy } from '../site/site';
import { foldName, isReservedName, lookOf } from './name-limits';
import { boundedPolicy, policyAllows, policyBreaches, startsWell } from './naming-policy';

/** Leaves out what the policy does not allow, accents first, so that "Küche 1" becomes "Kuche1". */
const leaveOut = (wanted: string, policy: NamingPolicy): string => {
  const allowed = [...wanted.normalize('NFD')].filter((character) => policyAllows(policy, character));
  while (allowed.length > 0 && !startsWell(policy, allowed.join(''))) allowed.shift();
  return allowed.slice(0, policy.maxLength).join('').replace(/[-_]+$/, '');
};

const numbered = (stem: string, number: number, policy: NamingPolicy): string => {
  const digits = String(number);
  const kept = stem.slice(0, Math.max(1, policy.maxLength - digits.length));
  return kept + digits.padStart(policy.minLength - kept.length, '0');
};

/** Names without case that a suggestion must differ from, and how they look. */
const takenTest = (taken: readonly string[]) => {
  const folded = new Set(taken.map(foldName));
  const looks = new Set(taken.map(lookOf));
  return (name: string): boolean => folded.has(foldName(name)) || looks.has(lookOf(name));
};

const lastResorts = ['P', ...'ABCDEFGHIJKLMNOPQRSTUVWXYZ', ...'abcdefghijklmnopqrstuvwxyz'];

/**
 * The nearest name to the one wanted that passes every rule and is unlike all those taken: by leaving out first
 * ("LARDER 1" gives "LARDER1"), by numbering second ("GRILL1" beside GRILL1 gives "GRILL2"). `avoid` adds a rule of
 * the caller's own. A policy whose names are all taken cannot be kept; then the shortest stem is numbered past it.
 */
export const suggestName = (wanted: string, taken: readonly string[], sitePolicy: NamingPolicy, avoid: (name: string) => boolean = () => false): string => {
  const policy = boundedPolicy(sitePolicy);
  const isTaken = takenTest(taken);
  const passes = (name: string): boolean => policyBreaches(policy, name).length === 0 && !isReservedName(name) && !isTaken(name) && !avoid(name);
  const base = leaveOut(wanted, policy);
  if (passes(base)) return base;
  const highest = Math.min(9999, 10 ** Math.max(0, policy.maxLength - 1) - 1);
  const unnumbered = base.replace(/\d+$/, '');
  const own = Number(base.slice(unnumbered.length));
  for (const stem of [unnumbered, base, ...lastResorts]) {
    if (stem === '') continue;
    const first = stem === unnumbered && own <= highest ? Math.max(1, own) : 1;
    for (let number = first; number <= highest; number += 1) {
      const candidate = numbered(stem, number, policy);
      if (passes(candidate)) return candidate;
    }
  }
  return lastResorts.find(passes) ?? numbered('P', taken.length + 1, { ...policy, maxLength: 31 });
};
