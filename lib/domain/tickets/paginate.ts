import type { Block } from './body-blocks';
import { heightOf, type Row } from './sheet';

/** Rows of text on a page: about 25 cm at six lines to the inch, as much as a hand holds and a rail takes. */
export const longestPageRows = 60;
const fewestBodyRows = 12;

const sameHeading = (left: Block | undefined, right: Block): boolean =>
  left !== undefined && JSON.stringify(left.heading) === JSON.stringify(right.heading);

/** The rows of one page: each heading once, and once more at the top of the next page. */
export const rowsOf = (blocks: readonly Block[]): readonly Row[] =>
  blocks.flatMap((block, index) => [...(sameHeading(blocks[index - 1], block) ? [] : block.heading), ...block.rows]);

/** Lines parted into pages under a head of so many rows; a line is never parted, even when it is longer than a page. */
export const paginate = (blocks: readonly Block[], headHeight: number): readonly (readonly Block[])[] => {
  const room = Math.max(fewestBodyRows, longestPageRows - headHeight);
  const pages: Block[][] = [];
  for (const block of blocks) {
    const page = pages.at(-1);
    if (page !== undefined && heightOf(rowsOf([...page, block])) <= room) page.push(block);
    else pages.push([block]);
  }
  return pages.length === 0 ? [[]] : pages;
};
