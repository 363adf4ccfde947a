// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { layOutTicket } from '@/lib/domain/tickets/lay-out-ticket';
import { sheetToText } from '@/lib/domain/tickets/sheet-to-text';
import { aPaperPrinter, aTicket, aTicketLine } from '@/tests/fixtures/build-ticket';
import { TicketPaper } from './ticket-paper';

const ticket = aTicket('Larder', {
  allergies: [{ seat: 2, words: 'tree nuts' }],
  courses: [{
    course: 'Starters',
    lines: [
      aTicketLine('Crab toast', { sourceLine: 0, seat: 1 }),
      aTicketLine('Crab toast', { sourceLine: 1, seat: 3 }),
      aTicketLine('Beetroot salad', { sourceLine: 2, seat: 2, allergies: ['tree nuts'] }),
    ],
  }],
});
const sheet = layOutTicket(ticket, aPaperPrinter());

afterEach(cleanup);

describe('a ticket drawn as paper', () => {
  it('shows the rows of the sheet, word for word', () => {
    const { container } = render(<TicketPaper sheet={sheet} label="Ticket for Larder" />);
    const rows = [...container.querySelectorAll('section > div > div')].map((row) => (row.textContent ?? '').trimEnd());
    expect(rows.join('\n')).toBe(sheetToText(sheet));
  });

  it('keeps to the grid and shows the same words in a frame', () => {
    const framed = layOutTicket(ticket, aPaperPrinter({ emphasis: 'frame' }));
    const { container } = render(<TicketPaper sheet={framed} label="Ticket for Larder" />);
    expect([...container.querySelectorAll('section > div > div')].map((row) => (row.textContent ?? '').trimEnd()).join('\n')).toBe(sheetToText(framed));
  });

  it('sets allergies strong and nothing else', () => {
    const { container } = render(<TicketPaper sheet={sheet} label="Ticket for Larder" />);
    expect([...container.querySelectorAll('strong')].map((strong) => strong.textContent?.trim())).toEqual(['ALLERGY seat 2', 'TREE NUTS', 'TREE NUTS']);
  });

  it('asks about the line whose name is pressed, and says which is chosen', () => {
    const onSelect = vi.fn();
    render(<TicketPaper sheet={sheet} label="Ticket for Larder" selectedLine={1} onSelect={onSelect} />);
    expect(screen.getByRole('button', { name: '2 CRAB TOAST' }).getAttribute('aria-pressed')).toBe('true');
    fireEvent.click(screen.getByRole('button', { name: '1 BEETROOT SALAD' }));
    expect(onSelect).toHaveBeenCalledWith(2);
  });

  it('is known by its label to those who do not see it', () => {
    render(<TicketPaper sheet={{ ...sheet, times: 2 }} label="Ticket for Larder from LARDER1" />);
    expect(screen.getByRole('region', { name: 'Ticket for Larder from LARDER1' }).textContent).toContain('Prints 2 times');
  });
});
