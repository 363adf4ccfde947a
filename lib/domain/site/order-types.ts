/** The ways a guest takes an order; on screen through `orderTypeWords`. */
export const orderTypes = ['eat-in', 'take-away', 'delivery'] as const;
export type OrderType = (typeof orderTypes)[number];

export const orderTypeWords: Readonly<Record<OrderType, string>> = {
  'eat-in': 'to eat in',
  'take-away': 'to take away',
  delivery: 'for delivery',
};
