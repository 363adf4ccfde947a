/**
 * Minimal cut sets up to an order: the smallest sets of elements whose failure together stops a function (NUREG-0492,
 * chapter VII). A set that contains a smaller cut is not minimal and left out.
 *
 * @param fails whether the function stops when exactly these elements have failed
 */
export const minimalCutSets = <Element>(elements: readonly Element[], fails: (failed: ReadonlySet<Element>) => boolean, maxOrder: number): readonly (readonly Element[])[] => {
  const cuts: (readonly Element[])[] = [];
  const contains = (set: readonly Element[], cut: readonly Element[]): boolean => cut.every((element) => set.includes(element));
  const combine = (start: number, chosen: readonly Element[], order: number): void => {
    if (chosen.length === order) {
      if (!cuts.some((cut) => contains(chosen, cut)) && fails(new Set(chosen))) cuts.push(chosen);
      return;
    }
    elements.slice(start).forEach((element, offset) => combine(start + offset + 1, [...chosen, element], order));
  };
  for (let order = 1; order <= maxOrder; order += 1) combine(0, [], order);
  return cuts;
};
