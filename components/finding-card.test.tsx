// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { severities } from '@/lib/domain/findings/finding';
import { FindingCard } from './finding-card';

afterEach(cleanup);

const shapeOf = (mark: Element): string => mark.firstElementChild?.tagName ?? '';

describe('a finding', () => {
  it('is told apart by words and by shape, not by colour alone', () => {
    for (const severity of severities) render(<FindingCard severity={severity} title="LARDER 1 has a space in its name" message="" />);
    const marks = ['to fix', 'to look at', 'to know'].map((name) => screen.getByRole('img', { name }));
    expect(new Set(marks.map(shapeOf)).size).toBe(3);
    expect(new Set(marks.map((mark) => mark.textContent)).size).toBe(3);
  });

  it('has its mend inside it', () => {
    render(<FindingCard severity="stop" title="LARDER 1 has a space in its name" message="It must read the same on all tills."><button>Rename to LARDER1</button></FindingCard>);
    expect(screen.getByRole('article').contains(screen.getByRole('button', { name: 'Rename to LARDER1' }))).toBe(true);
  });
});
