// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { asId } from '@/lib/domain/site/ids';
import { aGroup, anItem, anOption, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { TryOrder } from './try-order';

const site = aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }],
  tills: [aTill('till', 'room', '10.20.30.11', { name: 'Till 1' })],
  stations: [aStation('Grill', ['GRILL1']), aStation('Larder', ['LARDER1']), aStation('Pastry', ['PASTRY1'], { open: false })],
  printers: [aPrinter('GRILL1', '10.20.30.201'), aPrinter('LARDER1', '10.20.30.202'), aPrinter('PASTRY1', '10.20.30.203')],
  courses: [{ id: asId('mains'), name: 'Mains' }],
  menu: {
    sections: [aSection('Burgers'), aSection('Starters'), aSection('Desserts')],
    items: [
      anItem('burger', 'Burgers', { name: 'House burger', course: asId('mains'), optionGroups: [asId('cooking'), asId('sides')] }),
      anItem('crab', 'Starters', { name: 'Crab toast' }), anItem('flan', 'Desserts', { name: 'Flan' }), anItem('steak', 'Burgers', { name: 'Steak', soldOut: true }),
    ],
    optionGroups: [aGroup('cooking', ['rare', 'medium'], { name: 'Cooking', min: 1 }), aGroup('sides', ['salad'], { name: 'Sides' })],
    options: [anOption('rare', 'cooking', { name: 'Rare' }), anOption('medium', 'cooking', { name: 'Medium' }), anOption('salad', 'sides', { name: 'Side salad' })],
  },
  plans: [aPlan([
    aRule('burgers', 'send', { kind: 'section', section: asId('Burgers') }, ['Grill']),
    aRule('starters', 'send', { kind: 'section', section: asId('Starters') }, ['Larder']),
    aRule('desserts', 'send', { kind: 'section', section: asId('Desserts') }, ['Pastry']),
    aRule('salad', 'split', { kind: 'option', option: asId('salad') }, ['Larder']),
  ])],
});

const add = (typed: string): void => {
  const search = screen.getByRole('combobox', { name: 'Add an item' });
  fireEvent.change(search, { target: { value: typed } });
  fireEvent.keyDown(search, { key: 'Enter' });
};
const ticketFor = (station: string): string => screen.getByRole('region', { name: new RegExp(`^Ticket for ${station}`) }).textContent ?? '';

beforeAll(() => {
  Element.prototype.scrollIntoView = vi.fn();
});
afterEach(() => {
  cleanup();
  sessionStorage.clear();
});

describe('trying an order', () => {
  it('shows paper at one press of a ready order', () => {
    render(<TryOrder site={site} livePlan={null} />);
    fireEvent.click(screen.getByRole('button', { name: /House burger with side salad/ }));
    expect(screen.getByRole('heading', { name: 'Everything prints: 2 tickets from 2 printers' })).toBeTruthy();
    expect(ticketFor('Grill')).toContain('1 HOUSE BURGER');
    expect(ticketFor('Larder')).toContain('for HOUSE BURGER');
    expect(screen.getByText('PASTRY1 prints nothing for this order.')).toBeTruthy();
  });

  it('adds three at one typing, by the keyboard alone', () => {
    render(<TryOrder site={site} livePlan={null} />);
    add('3 crab');
    expect(ticketFor('Larder')).toContain('3 CRAB TOAST');
  });

  it('keeps what was written over a reload', () => {
    const { unmount } = render(<TryOrder site={site} livePlan={null} />);
    add('crab');
    fireEvent.change(screen.getByLabelText('Table'), { target: { value: '27' } });
    unmount();
    render(<TryOrder site={site} livePlan={null} />);
    expect(ticketFor('Larder')).toMatch(/TABLE 27.*1 CRAB TOAST/);
  });

  it('begins afresh when what the browser kept cannot be read', () => {
    sessionStorage.setItem(`tamis.try.${site.id}`, '{"plan":7}');
    render(<TryOrder site={site} livePlan={null} />);
    expect(screen.getByRole('heading', { name: 'Take a ready order, or add the first item' })).toBeTruthy();
  });

  it('says what is lost as the kitchen is now, and why', () => {
    render(<TryOrder site={site} livePlan={null} />);
    add('flan');
    expect(screen.getByRole('heading', { name: /^Everything prints/ })).toBeTruthy();
    fireEvent.click(screen.getByRole('radio', { name: 'As it is now' }));
    expect(screen.getByRole('heading', { name: '1 line would print nowhere' })).toBeTruthy();
    expect(screen.getByRole('complementary', { name: 'Why it prints there' }).textContent).toContain('Pastry is closed and has no stand-in');
  });

  it('explains the line that is pressed on its ticket', () => {
    render(<TryOrder site={site} livePlan={null} />);
    fireEvent.click(screen.getByRole('button', { name: /House burger with side salad/ }));
    fireEvent.click(screen.getByRole('button', { name: '1 SIDE SALAD' }));
    const why = screen.getByRole('complementary', { name: 'Why it prints there' });
    expect(within(why).getByRole('heading', { name: 'Why House burger is on 2 tickets' })).toBeTruthy();
    expect(why.textContent).toContain('Side salad splits to Larder');
  });

  it('offers a note that looks like an allergy as one, and prints it', () => {
    render(<TryOrder site={site} livePlan={null} />);
    add('burger');
    fireEvent.change(screen.getByLabelText('For'), { target: { value: '2' } });
    fireEvent.change(screen.getByLabelText('Note'), { target: { value: 'no walnuts' } });
    expect(ticketFor('Grill')).not.toContain('ALLERGY');
    fireEvent.click(screen.getByRole('button', { name: 'Say it as an allergy: Tree nuts' }));
    expect(ticketFor('Grill')).toMatch(/ALLERGY seat 2.*TREE NUTS.*TREE NUTS/);
  });

  it('says on the line that it is sold out, and prints the rest', () => {
    render(<TryOrder site={site} livePlan={null} />);
    add('crab');
    add('steak');
    expect(screen.getByRole('heading', { name: '1 line is refused, the rest prints: 1 ticket from 1 printer' })).toBeTruthy();
    expect(screen.getByRole('button', { name: /Steak is sold out/ })).toBeTruthy();
  });

  it('brings back the order that a ready one replaced', () => {
    render(<TryOrder site={site} livePlan={null} />);
    add('3 crab');
    fireEvent.click(screen.getByRole('button', { name: 'Clear the order' }));
    fireEvent.click(screen.getByRole('button', { name: 'Bring back the earlier order' }));
    expect(ticketFor('Larder')).toContain('3 CRAB TOAST');
  });

  it('tries the live plan first, and the edited one when asked', () => {
    render(<TryOrder site={site} livePlan={{ ...site.plans[0]!, version: 0, rules: [] }} />);
    add('crab');
    expect(screen.getByRole('heading', { name: '1 line would print nowhere' })).toBeTruthy();
    fireEvent.change(screen.getByLabelText('Plan'), { target: { value: site.plans[0]!.id } });
    expect(screen.getByRole('heading', { name: /^Everything prints/ })).toBeTruthy();
  });

  it('says what is missing on a site without tills or plans', () => {
    const { rerender } = render(<TryOrder site={{ ...site, tills: [] }} livePlan={null} />);
    expect(screen.getByText('This site has no till to order from. Add one first.')).toBeTruthy();
    rerender(<TryOrder key="other" site={{ ...site, plans: [] }} livePlan={null} />);
    expect(screen.getByText('This site has no plan yet. Make one on the board first.')).toBeTruthy();
  });
});
