import type { Block } from './layout.js';

/** What every mail about an order says of it. */
export interface AboutOrder {
  reference: string;
  title: string;
  shockName: string;
  /** Where the reader finds it: the rider's page of the order, or the desk. */
  url: string;
}

export const facts = (order: AboutOrder, ...rows: (readonly [string, string])[]): Block => ({
  kind: 'facts',
  rows: [['Order', order.reference], ['Bike', order.title], ['Shock', order.shockName], ...rows],
});

export const look = (order: AboutOrder, label = 'Look at your order'): Block => ({
  kind: 'button',
  label,
  url: order.url,
});

export const help: Block = {
  kind: 'note',
  text: 'Questions? Answer this mail, or write to help@linkfell.example with the reference.',
};
