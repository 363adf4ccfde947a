import { pieceMaker, type Loss, type Piece } from '@/lib/domain/routing/pieces';
import { routeAgain } from '@/lib/domain/routing/route-again';
import type { CourseId, TillId } from '@/lib/domain/site/ids';
import { quantityLeft, type TabLine } from './tab';
import { courseName, courseOf, indexesOf, nothing, partsOf, type Step, type Work } from './work';

/** "Mains away": what was held goes to the cooks, wherever its stations are by now. A null course fires all. */
export const fire = ({ kitchen, routing, tab, print }: Work, till: TillId, course: CourseId | null): Step => {
  const { site } = kitchen;
  const makePieces = pieceMaker(site);
  const fired = new Set(indexesOf(tab, (line) => line.held && (course === null || courseOf(site, line) === course)));
  if (fired.size === 0) return [tab, nothing(`Nothing is held for ${courseName(site, course)}. Nothing printed.`)];
  const pieces: Piece[] = [];
  const losses: Loss[] = [];
  const lines = tab.lines.map((line, index): TabLine => {
    if (!fired.has(index) || line.route === null) return line;
    const route = routeAgain(routing, line.route, till);
    const made = makePieces(tab, line.line, index, route, [], quantityLeft(line));
    pieces.push(...made.pieces);
    losses.push(...made.losses);
    return { ...line, held: false, route, printed: [...line.printed.filter((part) => !made.pieces.some((piece) => piece.kind === part.kind && piece.station === part.station && piece.option === part.option)), ...partsOf(made.pieces, index)] };
  });
  const after = { ...tab, lines };
  return [after, print(after, till, { kind: 'fire', words: [`${courseName(site, course)} away`] }, { pieces, losses })];
};

