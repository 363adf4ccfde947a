// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { roles, type Role } from '@/lib/domain/roles/permissions';
import { homePath, navigationFor } from '@/lib/navigation';
import { RailNav } from './rail-nav';

const address = vi.hoisted(() => ({ path: '' }));
vi.mock('next/navigation', () => ({ usePathname: () => address.path }));

const hang = (role: Role, path: string): readonly string[] => {
  address.path = path;
  render(<RailNav siteId="lantern-yard" links={navigationFor(role)} />);
  return screen.getAllByRole('link').map((link) => link.textContent);
};

afterEach(cleanup);

describe('the pages on the rail', () => {
  it.each<[Role, string, string]>([
    ['chef', 'Stations', 'Printers'],
    ['installer', 'Printers', 'Menu'],
    ['trainer', 'Try an order', 'Stations'],
    ['owner', 'People', 'Sites'],
  ])('a %s sees %s and is not shown %s', (role, theirs, notTheirs) => {
    const names = hang(role, '/sites/lantern-yard/board');
    expect(names).toContain(theirs);
    expect(names).not.toContain(notTheirs);
  });

  it.each(roles)('a %s starts on one of the pages that hang there', (role) => {
    hang(role, homePath('lantern-yard', role));
    expect(screen.getByRole('link', { current: 'page' }).getAttribute('href')).toBe(homePath('lantern-yard', role));
  });

  it('exactly one page is the open one, also for what lies below it', () => {
    hang('installer', '/sites/lantern-yard/printers/new');
    expect(screen.getAllByRole('link', { current: 'page' }).map((link) => link.textContent)).toEqual(['Printers']);
  });
});
