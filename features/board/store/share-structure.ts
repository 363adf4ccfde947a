type Parts = Readonly<Record<string, unknown>>;

const isParts = (value: unknown): value is Parts => typeof value === 'object' && value !== null;
const idOf = (value: unknown): unknown => (isParts(value) ? value['id'] : undefined);

const shareList = (previous: readonly unknown[], next: readonly unknown[]): readonly unknown[] => {
  const byId = new Map(previous.filter((member) => idOf(member) !== undefined).map((member) => [idOf(member), member]));
  const shared = next.map((member, place) => shareStructure(byId.get(idOf(member)) ?? previous[place], member));
  return shared.length === previous.length && shared.every((member, place) => Object.is(member, previous[place])) ? previous : shared;
};

const shareParts = (previous: Parts, next: Parts): Parts => {
  const shared = Object.fromEntries(Object.entries(next).map(([key, value]) => [key, shareStructure(previous[key], value)]));
  const same = Object.keys(previous).length === Object.keys(shared).length
    && Object.entries(shared).every(([key, value]) => key in previous && Object.is(value, previous[key]));
  return same ? previous : shared;
};

/**
 * `next`, with every part that says the same as in `previous` replaced by that very part; members of a list are
 * matched by their `id`, else by place. What is drawn from a part that kept its identity need not be drawn again.
 * For plain data: objects, arrays and primitive values.
 */
export const shareStructure = <Value>(previous: unknown, next: Value): Value => {
  if (!isParts(previous) || !isParts(next)) return next;
  if (Array.isArray(previous) && Array.isArray(next)) return shareList(previous, next) as Value;
  if (Array.isArray(previous) || Array.isArray(next)) return next;
  return shareParts(previous, next) as Value;
};
