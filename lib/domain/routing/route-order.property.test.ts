import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Ticket, TicketLine } from '@/lib/domain/tickets/ticket';
import { generatedOrder } from '@/tests/fixtures/generated-order';
import { seeded } from '@/tests/fixtures/generated-site';
import { allergiesOf } from './pieces';
import { routeOrder } from './route-order';

const clock = { time: '19:42' };
const linesOf = (ticket: Ticket): readonly TicketLine[] => ticket.courses.flatMap((course) => course.lines);

describe('sending an order', () => {
  it('gives every line exactly one outcome', () => {
    fc.assert(fc.property(generatedOrder, ({ site, plan, present, order }) => {
      const routed = routeOrder(site, plan, present, order, clock);
      expect(routed.lines.map((line) => line.line)).toEqual(order.lines.map((_, index) => index));
    }), seeded);
  });

  it('never carries a unit twice on one ticket', () => {
    fc.assert(fc.property(generatedOrder, ({ site, plan, present, order }) => {
      for (const ticket of routeOrder(site, plan, present, order, clock).tickets) {
        const lines = linesOf(ticket);
        const dishes = lines.filter((line) => line.forDish === null).map((line) => line.sourceLine);
        const options = lines.flatMap((line) => [...(line.forDish === null ? [] : [`${line.sourceLine} ${line.name}`]), ...line.options.map((option) => `${line.sourceLine} ${option.name}`)]);
        expect(new Set(dishes).size).toBe(dishes.length);
        if (plan.rules.every((rule) => rule.kind !== 'split' || !rule.keep)) expect(new Set(options).size).toBe(options.length);
      }
    }), seeded);
  });

  it('prints at each cooking station exactly the quantity ordered', () => {
    fc.assert(fc.property(generatedOrder, ({ site, plan, present, order }) => {
      const routed = routeOrder(site, plan, present, order, clock);
      for (const { line, route } of routed.lines) {
        const ordered = order.lines[line]!;
        if (route === null || ordered.held === true) continue;
        const cooks = new Set(route.cook.routes.filter((one) => one.printer !== null).map((one) => one.reached!));
        for (const station of cooks) {
          const printed = routed.tickets
            .filter((ticket) => ticket.stations.some((one) => one.id === station))
            .flatMap(linesOf)
            .filter((one) => one.sourceLine === line && one.forDish === null && !one.marks.includes('COPY') && (one.stationCodes.length === 0 || one.stationCodes.includes(site.stations.find((each) => each.id === station)!.code)));
          expect(printed.reduce((sum, one) => sum + one.quantity, 0)).toBe(ordered.quantity);
        }
      }
    }), seeded);
  });

  it('names every allergy of a seat at the head of each ticket with food for it, and at the line', () => {
    fc.assert(fc.property(generatedOrder, ({ site, plan, present, order }) => {
      for (const ticket of routeOrder(site, plan, present, order, clock).tickets) {
        for (const line of linesOf(ticket)) {
          const said = allergiesOf(order, order.lines[line.sourceLine]!);
          expect(line.allergies).toEqual(said);
          for (const words of said) expect(ticket.allergies.map((allergy) => allergy.words)).toContain(words);
        }
      }
    }), seeded);
  });

  it('shows held lines to nobody who cooks', () => {
    fc.assert(fc.property(generatedOrder, ({ site, plan, present, order }) => {
      for (const line of routeOrder(site, plan, present, order, clock).tickets.flatMap(linesOf)) {
        expect(line.marks.includes('HOLD')).toBe(order.lines[line.sourceLine]!.held ?? false);
      }
    }), seeded);
  });

  it('loses in words exactly what does not print', () => {
    fc.assert(fc.property(generatedOrder, ({ site, plan, present, order }) => {
      const open = { ...order, lines: order.lines.map((line) => ({ ...line, held: false })) };
      const routed = routeOrder(site, plan, present, open, clock);
      for (const { line, outcome } of routed.lines) {
        const lost = routed.losses.some((loss) => loss.sourceLine === line && loss.kind !== 'copy');
        expect(outcome === 'part lost' || outcome === 'lost').toBe(lost);
      }
    }), seeded);
  });

  it('gives the same tickets for the same order, always', () => {
    fc.assert(fc.property(generatedOrder, ({ site, plan, present, order }) => {
      expect(routeOrder(site, plan, present, order, clock)).toEqual(routeOrder(structuredClone(site), structuredClone(plan), present, order, clock));
    }), { ...seeded, numRuns: 100 });
  });
});
