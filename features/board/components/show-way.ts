import type { BoardSite } from '@/lib/domain/plans/board-site';
import type { Card } from '@/lib/domain/plans/board';
import type { ProofFinding } from '@/lib/domain/proof/summary';
import type { BoardState } from '../store/board-state';
import { allCards } from '../store/lift';

const concerns = (card: Card, finding: ProofFinding, site: BoardSite): boolean => {
  const { target } = card;
  const item = finding.example?.item;
  const section = site.menu.items.find((each) => each.id === item)?.section;
  if (card.rule !== null && finding.subject.kind === 'rule') return card.rule === finding.subject.id;
  if (target.kind === 'section') return target.section === (finding.subject.kind === 'section' ? finding.subject.id : section);
  return target.kind === 'item' && target.item === (finding.subject.kind === 'item' ? finding.subject.id : item);
};

/** The papers on the board that a finding is about. */
export const cardsShowing = (state: BoardState, finding: ProofFinding, site: BoardSite): ReadonlySet<string> =>
  new Set(allCards(state).filter((card) => concerns(card, finding, site)).map((card) => card.id));
