import type { separationKinds } from '../schemas/analysis.ts';
import type { Cells } from './cells.ts';
import { addToOrder, emptyOrder, separationAlong, type Order } from './order.ts';

export type SeparationKind = (typeof separationKinds)[number];

/** The order of the trials along z, per configuration. */
export function ordersByConfiguration(cells: Cells): Order[] {
  const orders = Array.from({ length: cells.configurations }, emptyOrder);
  for (let i = 0; i < cells.size; i++) {
    const order = orders[cells.configuration[i]];
    addToOrder(order, cells.z[i], cells.k[i], cells.n[i] - cells.k[i]);
  }
  return orders;
}

/**
 * Separation of the scaled model (one intercept, one slope on ln α + ln J) and of every
 * configuration by itself (intercept and slope on ln α). A configuration with one kind of outcome
 * only is completely separated.
 */
export function separation(cells: Cells): {
  overall: SeparationKind;
  configurations: SeparationKind[];
} {
  const all = emptyOrder();
  for (let i = 0; i < cells.size; i++) {
    addToOrder(all, cells.z[i], cells.k[i], cells.n[i] - cells.k[i]);
  }
  return {
    overall: separationAlong(all),
    configurations: ordersByConfiguration(cells).map(separationAlong),
  };
}
