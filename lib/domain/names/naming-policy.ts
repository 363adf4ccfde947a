import type { NamingPolicy } from '../site/site';
import { longestNameBytes } from './name-limits';

/** Short, no spaces, the same everywhere: common practice, until a site says otherwise. */
export const defaultNamingPolicy: NamingPolicy = { minLength: 2, maxLength: 12, allowUnderscore: true, allowHyphen: true, mustStartWithLetter: true };

/** The policy as it can be kept: lengths within the hard limit, and the shortest not longer than the longest. */
export const boundedPolicy = (policy: NamingPolicy): NamingPolicy => {
  const maxLength = Math.min(longestNameBytes, Math.max(1, Math.trunc(policy.maxLength)));
  return { ...policy, maxLength, minLength: Math.min(maxLength, Math.max(1, Math.trunc(policy.minLength))) };
};

export const policyAllows = (policy: NamingPolicy, character: string): boolean =>
  /^[A-Za-z0-9]$/.test(character) || (character === '-' && policy.allowHyphen) || (character === '_' && policy.allowUnderscore);

export const startsWell = (policy: NamingPolicy, name: string): boolean => (policy.mustStartWithLetter ? /^[A-Za-z]/ : /^[A-Za-z0-9]/).test(name);

export type PolicyBreach = 'short' | 'long' | 'start' | 'character';

/** What about a name is outside the site's policy; empty when nothing is. */
export const policyBreaches = (policy: NamingPolicy, name: string): readonly PolicyBreach[] => {
  const { minLength, maxLength } = boundedPolicy(policy);
  const characters = [...name];
  const breaches: readonly (readonly [PolicyBreach, boolean])[] = [
    ['short', characters.length < minLength],
    ['long', characters.length > maxLength],
    ['start', !startsWell(policy, name)],
    ['character', characters.some((character) => !policyAllows(policy, character))],
  ];
  return breaches.flatMap(([breach, holds]) => (holds ? [breach] : []));
};

/** "2 to 12 letters, digits, hyphens or underscores, starting with a letter" */
export const sayPolicy = (policy: NamingPolicy): string => {
  const { minLength, maxLength } = boundedPolicy(policy);
  const kinds = ['letters', 'digits', ...(policy.allowHyphen ? ['hyphens'] : []), ...(policy.allowUnderscore ? ['underscores'] : [])];
  const listed = `${kinds.slice(0, -1).join(', ')} or ${kinds.at(-1)}`;
  return `${minLength === maxLength ? minLength : `${minLength} to ${maxLength}`} ${listed}, starting with a letter${policy.mustStartWithLetter ? '' : ' or a digit'}`;
};
