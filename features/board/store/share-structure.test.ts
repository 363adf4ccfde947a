import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { shareStructure } from './share-structure';

describe('sharing structure', () => {
  it('keeps the identity of what did not change', () => {
    const before = { rails: [{ id: 'a', cards: [{ id: 1 }, { id: 2 }] }, { id: 'b', cards: [] }], tray: [] };
    const after = shareStructure(before, { rails: [{ id: 'a', cards: [{ id: 0 }, { id: 1 }, { id: 2 }] }, { id: 'b', cards: [] }], tray: [] });
    expect(after.rails[1]).toBe(before.rails[1]);
    expect(after.tray).toBe(before.tray);
    expect(after.rails[0]).not.toBe(before.rails[0]);
    expect(after.rails[0]?.cards[1]).toBe(before.rails[0]?.cards[0]);
  });

  it('gives back the very same value when nothing changed', () => {
    fc.assert(fc.property(fc.jsonValue(), (value) => {
      expect(shareStructure(value, structuredClone(value))).toBe(value);
    }), { seed: 20261201, examples: [[{ a: [1, { id: 'x' }] }]] });
  });

  it('never changes what the value says', () => {
    fc.assert(fc.property(fc.jsonValue(), fc.jsonValue(), (before, after) => {
      expect(shareStructure(before, after)).toEqual(after);
    }), { seed: 20261201 });
  });
});
