import { sayPolicy } from '@/lib/domain/names/naming-policy';
import type { Site } from '@/lib/domain/site/site';
import { valuesOf } from './parts';
import type { Part, Values } from './schema';
import { contactWords, followWords, linkWords, sayLanguage, sharedPointWords } from './words';

export type Fact = { readonly label: string; readonly value: string };

/** What names things that values only point to. */
export type Naming = Pick<Site, 'tills'>;

const none = 'Nobody has said';
const given = (text: string): string => (text === '' ? none : text);
const joined = (lines: readonly string[]): string => (lines.length === 0 ? 'None' : lines.join('; '));
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
    { label: 'Reserved', value: joined(reserved.map(({ address, reason }) => (reason === '' ? address : `${address} for ${reason}`))) },
  ],
  link: linkFacts,
  'shared-points': ({ points }) => [{ label: 'Shared points', value: joined(points.map(({ name, kind }) => `${name} (${sharedPointWords[kind].toLowerCase()})`)) }],
  names: (policy) => [
    { label: 'A good name has', value: sayPolicy(policy) },
    { label: 'Hyphens', value: yes(policy.allowHyphen) },
    { label: 'Underscores', value: yes(policy.allowUnderscore) },
    { label: 'Starts with a letter', value: yes(policy.mustStartWithLetter) },
  ],
  courses: ({ courses }) => [{ label: 'Courses', value: joined(courses.map(({ name }) => name)) }],
  follow: ({ follows }) => [{ label: 'The tills follow', value: followWords[follows].toLowerCase() }],
  contacts: ({ contacts }) => [{ label: 'Contacts', value: joined(contacts.map(({ kind, name, phone, email }) => [`${contactWords[kind]}: ${name}`, phone, email].filter((text) => text !== '').join(', '))) }],
};

export type Difference = { readonly label: string; readonly from: string; readonly to: string };

/** What a person would call different between two values of a part. */
export const settingDifferences = <Of extends Part>(part: Of, before: Values<Of>, after: Values<Of>, naming: Naming): readonly Difference[] => {
  const was = factsOf[part](before, naming);
  const is = factsOf[part](after, naming);
  return [...new Set([...was, ...is].map(({ label }) => label))].flatMap((label) => {
    const from = was.find((fact) => fact.label === label)?.value ?? 'None';
    const to = is.find((fact) => fact.label === label)?.value ?? 'None';
    return from === to ? [] : [{ label, from, to }];
  });
};

/** The values of a part as the site has them. */
export const partOf = <Of extends Part>(part: Of, site: Site): Values<Of> => valuesOf[part](site);
