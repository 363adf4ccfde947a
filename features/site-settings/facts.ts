import { sayPolicy } from '@/lib/domain/names/naming-policy';
import type { Site } from '@/lib/domain/site/site';
import { valuesOf } from './parts';
import type { Part, Values } from './schema';
import { contactWords, followWords, linkWords, sayLanguage, sharedPointWords } from './words';

export type Fact = {
  readonly label: string;
  readonly value: string;
  /** One by one, where the value is a list. */
  readonly entries?: readonly string[];
};

/** What names things that values only point to. */
export type Naming = Pick<Site, 'tills'>;

const none = 'Nobody has said';
const given = (text: string): string => (text === '' ? none : text);
const listed = (label: string, entries: readonly string[]): Fact => ({ label, value: entries.length === 0 ? 'None' : entries.join(', '), entries });
const yes = (value: boolean): string => (value ? 'yes' : 'no');

const linkFacts = ({ kind, till, address, mask }: Values<'link'>, { tills }: Naming): readonly Fact[] => [
  { label: 'Runs', value: linkWords[kind] },
  ...(kind === 'till' ? [{ label: 'Till', value: tills.find(({ id }) => id === till)?.name ?? 'A till that is gone' }] : []),
  ...(kind === 'own' ? [{ label: 'Address', value: given(address) }, { label: 'Mask', value: given(mask) }] : []),
];

/** What a part says, for reading, for telling two apart, and for the history. */
export const factsOf: { readonly [Of in Part]: (values: Values<Of>, naming: Naming) => readonly Fact[] } = {
  about: ({ name, place, timeZone, language }) => [
    { label: 'Name', value: name }, { label: 'Place', value: given(place) }, { label: 'Time zone', value: timeZone }, { label: 'Language', value: sayLanguage(language) },
  ],
  network: ({ subnet, gateway, poolFrom, poolTo, reserved }) => [
    { label: 'Network', value: given(subnet) },
    { label: 'Router', value: given(gateway) },
    { label: 'Router hands out', value: poolFrom === '' && poolTo === '' ? 'Nothing' : `${given(poolFrom)} to ${given(poolTo)}` },
    listed('Reserved', reserved.map(({ address, reason }) => (reason === '' ? address : `${address} for ${reason}`))),
  ],
  link: linkFacts,
  'shared-points': ({ points }) => [listed('Shared points', points.map(({ name, kind }) => `${name} (${sharedPointWords[kind].toLowerCase()})`))],
  names: (policy) => [
    { label: 'A good name has', value: sayPolicy(policy) },
    { label: 'Hyphens', value: yes(policy.allowHyphen) },
    { label: 'Underscores', value: yes(policy.allowUnderscore) },
    { label: 'Starts with a letter', value: yes(policy.mustStartWithLetter) },
  ],
  courses: ({ courses }) => [listed('Courses', courses.map(({ name }) => name))],
  follow: ({ follows }) => [{ label: 'The tills follow', value: followWords[follows].toLowerCase() }],
  contacts: ({ contacts }) => [listed('Contacts', contacts.map(({ kind, name, phone, email }) => [`${contactWords[kind]} ${name}`, phone, email].filter((text) => text !== '').join(' ')))],
};

export type Difference = { readonly label: string; readonly from: string; readonly to: string };

/** "4, with Cheese, without Starters": of a long list only what came and went is news. */
const sayEntries = (before: readonly string[], after: readonly string[]): string => {
  const came = after.filter((entry) => !before.includes(entry));
  const went = before.filter((entry) => !after.includes(entry));
  const news = [...(came.length === 0 ? [] : [`with ${came.join(', ')}`]), ...(went.length === 0 ? [] : [`without ${went.join(', ')}`])];
  return [`${after.length}`, ...(news.length === 0 ? ['in another order'] : news)].join(', ');
};

const differenceOf = (label: string, was: Fact | undefined, is: Fact | undefined): readonly Difference[] => {
  const [from, to] = [was?.value ?? 'None', is?.value ?? 'None'];
  if (from === to) return [];
  if (was?.entries === undefined || is?.entries === undefined) return [{ label, from, to }];
  return [{ label, from: `${was.entries.length}`, to: sayEntries(was.entries, is.entries) }];
};

/** What a person would call different between two values of a part. */
export const settingDifferences = <Of extends Part>(part: Of, before: Values<Of>, after: Values<Of>, naming: Naming): readonly Difference[] => {
  const was = factsOf[part](before, naming);
  const is = factsOf[part](after, naming);
  return [...new Set([...was, ...is].map(({ label }) => label))]
    .flatMap((label) => differenceOf(label, was.find((fact) => fact.label === label), is.find((fact) => fact.label === label)));
};

/** The values of a part as the site has them. */
export const partOf = <Of extends Part>(part: Of, site: Site): Values<Of> => valuesOf[part](site);
