import type { Finding } from '../findings/finding';
import type { ItemId, OptionId, PrinterId, TillId } from '../site/ids';
import type { OrderType } from '../site/order-types';
import { orderTypeWords } from '../site/order-types';
import type { Site } from '../site/site';

/** One line that the proof tried; the area is the till's. */
export type WayToOrder = {
  readonly till: TillId;
  readonly orderType: OrderType;
  readonly item: ItemId;
  readonly options: readonly OptionId[];
};

/** A finding, with one concrete order that shows it when there is one. */
export type ProofFinding = Finding & { readonly example: WayToOrder | null };

/**
 * All ways to order as one sieve, read row by row: cell c stands for the ways from c * total / cells up to the next
 * cell's. A cell is lost when any way in it is.
 */
export type ProofMesh = {
  readonly cells: number;
  readonly total: number;
  /** Positions of the lost cells, 0 to cells - 1, rising. */
  readonly lost: readonly number[];
};

/** What one stopped printer would take with it. */
export type DrillLine = {
  readonly printer: PrinterId;
  readonly name: string;
  readonly itemsLost: number;
  readonly tillsAffected: number;
};

/** What a checking screen says of one plan: plain data, small enough to send to a browser. */
export type ProofSummary = {
  /** Items that print nowhere from at least one till in at least one way. */
  readonly lostItems: number;
  /** Items of which only some of the cooking stations print. */
  readonly partLostItems: number;
  readonly ways: number;
  readonly items: number;
  readonly options: number;
  readonly tills: number;
  readonly orderTypes: number;
  readonly mesh: ProofMesh;
  /** Worst first. */
  readonly findings: readonly ProofFinding[];
  /** One line a printer that the plan uses, most items lost first. */
  readonly drill: readonly DrillLine[];
};

/** How many cells a screen draws: 4 rows of 30. */
export const meshCells = 120;

export type VerdictPart = { readonly words: string; readonly hot: boolean };

const countItems = (count: number): string => (count === 1 ? '1 item' : `${count} items`);

/** The sentence in large type. Only what an order would be lost by is hot. */
export const verdictOf = (summary: Pick<ProofSummary, 'lostItems' | 'partLostItems' | 'findings' | 'ways'>): readonly VerdictPart[] => {
  if (summary.ways === 0) return [{ words: 'Nothing to order yet', hot: false }];
  if (summary.lostItems > 0) {
    return [{ words: `${countItems(summary.lostItems)} would print `, hot: false }, { words: 'nowhere', hot: true }];
  }
  if (summary.partLostItems > 0) {
    return [{ words: `${countItems(summary.partLostItems)} would print `, hot: false }, { words: 'only in part', hot: true }];
  }
  const toFix = summary.findings.filter((finding) => finding.severity === 'stop').length;
  if (toFix > 0) return [{ words: `Every item prints, ${toFix} to fix before it can go live`, hot: false }];
  return [{ words: 'Every item prints, from every till', hot: false }];
};

/** "Cheese toastie with side salad from Till 2, to eat in". */
export const sayWay = (way: WayToOrder, site: Site): string => {
  const item = site.menu.items.find((candidate) => candidate.id === way.item)?.name ?? 'An item';
  const till = site.tills.find((candidate) => candidate.id === way.till)?.name ?? 'a till';
  const options = site.menu.options.filter((option) => way.options.includes(option.id)).map((option) => option.name);
  const withOptions = options.length === 0 ? item : `${item} with ${options.join(' and ')}`;
  return `${withOptions} from ${till}, ${orderTypeWords[way.orderType]}`;
};
