import type { NamingPolicy, Site } from '../site/site';
import type { Printer } from '../site/printer';
import { foldName, lookOf } from './name-limits';
import { suggestName } from './suggest-name';

export type NameSite = Pick<Site, 'namingPolicy' | 'printers' | 'stations'>;

/** What a printer name is judged against. */
export type NameContext = {
  /** The printer's id, for its findings. */
  readonly id: string;
  readonly policy: NamingPolicy;
  /** Every other printer's name. */
  readonly others: readonly string[];
  /** Of those, the ones that keep theirs when two are alike, so that one mistake makes one finding. */
  readonly rivals: readonly string[];
  /** Stations that print here, and those that do not; both empty of meaning while no station does. */
  readonly ownStations: readonly string[];
  readonly otherStations: readonly string[];
};

const settled = { planned: 0, addressed: 1, reachable: 2, tested: 3, 'signed-off': 4 } as const;

/** `yields` while the name is being typed: then every other printer keeps its own. */
export const nameContextOf = (site: NameSite, printer: Pick<Printer, 'id' | 'stage'>, yields = false): NameContext => {
  const place = site.printers.findIndex((one) => one.id === printer.id);
  const keepsBefore = (other: Printer, index: number): boolean =>
    yields || settled[other.stage] > settled[printer.stage] || (settled[other.stage] === settled[printer.stage] && index < place);
  const others = site.printers.map((one, index) => ({ one, index })).filter(({ one }) => one.id !== printer.id);
  return {
    id: printer.id,
    policy: site.namingPolicy,
    others: others.map(({ one }) => one.name),
    rivals: others.filter(({ one, index }) => keepsBefore(one, index)).map(({ one }) => one.name),
    ownStations: site.stations.filter((station) => station.printers.includes(printer.id)).map((station) => station.name),
    otherStations: site.stations.filter((station) => !station.printers.includes(printer.id)).map((station) => station.name),
  };
};

const wordsOf = (text: string): readonly string[] => (text.match(/\p{L}+/gu) ?? []).map(foldName);

const holdsWords = (name: string, station: string): boolean => {
  const words = wordsOf(name);
  const sought = wordsOf(station);
  return sought.length > 0 && words.some((_, start) => sought.every((word, offset) => words[start + offset] === word));
};

/** The station that a name speaks of although the printer does not print for it; none while it prints for nobody. */
export const misleadingStation = (name: string, context: NameContext): string | undefined => {
  if (context.ownStations.some((station) => holdsWords(name, station))) return undefined;
  return context.ownStations.length === 0 ? undefined : context.otherStations.find((station) => holdsWords(name, station));
};

const withoutStation = (name: string, station: string): string =>
  wordsOf(station).reduce((left, word) => left.replace(new RegExp(`(?<!\\p{L})${word}(?!\\p{L})`, 'iu'), ''), name);

/** A name for this printer that passes every rule and that nobody else has. */
export const suggestFor = (name: string, context: NameContext): string => {
  const misleads = (candidate: string): boolean => misleadingStation(candidate, context) !== undefined;
  const station = misleadingStation(name, context);
  const [own] = context.ownStations;
  const left = station === undefined ? name : withoutStation(name, station);
  const wanted = /\p{L}/u.test(left) ? left : own === undefined ? 'PRINTER1' : `${own.toUpperCase()}1`;
  return suggestName(wanted, context.others, context.policy, misleads);
};

export const equalRival = (name: string, context: NameContext): string | undefined =>
  context.rivals.find((rival) => foldName(rival) === foldName(name));

export const lookAlikeRival = (name: string, context: NameContext): string | undefined =>
  context.rivals.find((rival) => rival !== name && foldName(rival) !== foldName(name) && lookOf(rival) === lookOf(name));
