// @vitest-environment jsdom
import { act, cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { SaveAnswer, SaveRequest } from '../store/save-answer';
import { viewOf } from '@/tests/fixtures/board-view';
import { contentOf, burgers, rule } from '@/tests/fixtures/small-plan-site';
import { BoardScreen } from './board-screen';

const server = vi.hoisted(() => ({
  asked: [] as SaveRequest[],
  answer: null as SaveAnswer | null,
}));

vi.mock('../api/save-plan', () => ({
  savePlan: async (_site: string, _plan: string, request: SaveRequest): Promise<SaveAnswer> => {
    server.asked.push(request);
    return server.answer ?? { kind: 'saved', version: request.version + 1 };
  },
}));
vi.mock('../api/ping-presence', () => ({ pingPresence: async () => ({ others: ['Ines Okafor'], newest: 0 }) }));
vi.mock('../api/fetch-site', () => ({ fetchSite: async () => Promise.reject(new Error('no worker in a test')) }));
vi.mock('next/navigation', () => ({ useRouter: () => ({ refresh: () => undefined, push: () => undefined }) }));
vi.mock('next/dynamic', () => ({ default: () => () => null }));

const start = contentOf(rule('r1', 'send', burgers, ['grill']));
const settle = (): Promise<void> => act(async () => undefined);
const rail = (name: string): HTMLElement => screen.getByRole('region', { name });
const hung = (name: string): readonly (string | null)[] => within(rail(name)).queryAllByRole('listitem').map((card) => card.querySelector('b')?.textContent ?? null).filter((word) => word !== null);
const face = (name: RegExp): HTMLElement => screen.getByRole('button', { name });
const key = (name: string, more: object = {}): void => {
  if (document.activeElement !== null) fireEvent.keyDown(document.activeElement, { key: name, ...more });
};
const spoken = (): string => screen.getAllByRole('status').map((region) => region.textContent).filter((words) => words !== '').at(-1) ?? '';

beforeEach(() => {
  server.asked.length = 0;
  server.answer = null;
  localStorage.clear();
});
afterEach(cleanup);

describe('the board by keys', () => {
  it('lifts with Space, carries with the arrows, drops with Space, and the focus goes along', async () => {
    render(<BoardScreen view={viewOf(start)} />);
    face(/^Oysters/).focus();
    key(' ');
    expect(spoken()).toMatch(/^Oysters lifted from Prints nowhere yet/);
    key('ArrowDown');
    key('ArrowDown');
    expect(spoken()).toBe('Over Larder');
    expect(within(rail('Larder')).getByText('Oysters here')).toBeDefined();
    key(' ');
    await settle();
    expect(hung('Larder')).toEqual(['Oysters']);
    expect(spoken()).toBe('Oysters now print at Larder');
    expect(document.activeElement?.textContent).toContain('Oysters');
    expect(server.asked.map((request) => request.summary)).toEqual(['Oysters to Larder']);
  });

  it('puts back with Escape and saves nothing', async () => {
    render(<BoardScreen view={viewOf(start)} />);
    face(/^Oysters/).focus();
    key(' ');
    key('ArrowDown');
    key('Escape');
    await settle();
    expect(hung('Grill')).toEqual(['Burgers']);
    expect(spoken()).toBe('Oysters put back');
    expect(server.asked).toEqual([]);
  });

  it('puts back what was lifted when the focus goes elsewhere', () => {
    render(<BoardScreen view={viewOf(start)} />);
    face(/^Oysters/).focus();
    key(' ');
    key('ArrowDown');
    act(() => face(/^Burgers/).focus());
    expect(hung('Grill')).toEqual(['Burgers']);
    expect(screen.queryByText('Oysters here')).toBeNull();
  });

  it('chooses several with Shift and Space, and carries them together', async () => {
    render(<BoardScreen view={viewOf(start)} />);
    face(/^Burgers/).focus();
    key(' ', { shiftKey: true });
    face(/^Oysters/).focus();
    key(' ', { shiftKey: true });
    expect(screen.getByRole('region', { name: 'Chosen cards' }).textContent).toContain('2 sections chosen');
    key(' ');
    key('ArrowDown');
    key('ArrowDown');
    key('ArrowDown');
    key('Enter');
    await settle();
    expect(hung('Bar')).toEqual(['Burgers', 'Oysters']);
    expect(screen.queryByRole('region', { name: 'Chosen cards' })).toBeNull();
  });

  it('takes back and does again with Ctrl+Z and Ctrl+Shift+Z', async () => {
    render(<BoardScreen view={viewOf(start)} />);
    face(/^Oysters/).focus();
    key(' ');
    key('ArrowDown');
    key(' ');
    await settle();
    fireEvent.keyDown(window, { key: 'z', ctrlKey: true });
    await settle();
    expect(hung('Grill')).toEqual(['Burgers']);
    fireEvent.keyDown(window, { key: 'Z', ctrlKey: true, shiftKey: true });
    await settle();
    expect(hung('Grill')).toEqual(['Burgers', 'Oysters']);
    expect(server.asked.map((request) => request.version)).toEqual([7, 8, 9]);
  });
});

describe('what the board says', () => {
  it('who else is on it', async () => {
    render(<BoardScreen view={viewOf(start)} />);
    await settle();
    expect(screen.getByText(/is on this board too/).textContent).toBe('Ines Okafor is on this board too');
  });

  it('what somebody else changed, and does one\'s own again on the newest', async () => {
    server.answer = { kind: 'stale', version: 12, content: contentOf(rule('r1', 'send', burgers, ['bar'])), by: 'Ines Okafor' };
    render(<BoardScreen view={viewOf(start)} />);
    face(/^Oysters/).focus();
    key(' ');
    key('ArrowDown');
    key(' ');
    await settle();
    const asked = screen.getByRole('alertdialog');
    expect(asked.textContent).toContain('Ines Okafor: Burgers from Grill to Bar.');
    expect(asked.textContent).toContain('Not saved: Oysters to Grill.');
    server.answer = null;
    fireEvent.click(within(asked).getByRole('button', { name: 'Do mine again on the newest' }));
    await settle();
    expect([hung('Bar'), hung('Grill')]).toEqual([['Burgers'], ['Oysters']]);
    expect(server.asked.at(-1)?.version).toBe(12);
  });

  it('that the connection is out, and that nothing is lost', async () => {
    server.answer = { kind: 'unreachable' };
    render(<BoardScreen view={viewOf(start)} />);
    face(/^Oysters/).focus();
    key(' ');
    key('ArrowDown');
    key(' ');
    await settle();
    expect(screen.getByRole('alert').textContent).toContain('No connection. Your last change is kept in this browser and saved as soon as it is back.');
    expect(hung('Grill')).toEqual(['Burgers', 'Oysters']);
    server.answer = null;
    fireEvent.click(screen.getByRole('button', { name: 'Try again now' }));
    await settle();
    expect(screen.queryByRole('alert')).toBeNull();
  });

  it('to a role that may only look: no list, no lifting, and why', () => {
    render(<BoardScreen view={{ ...viewOf(start), mayWrite: false }} />);
    expect(screen.queryByRole('button', { name: /^Send to/ })).toBeNull();
    face(/^Oysters/).focus();
    key(' ');
    expect(spoken()).toBe('');
    expect(screen.getByText('You may look at this board, not change it.')).toBeDefined();
  });
});
