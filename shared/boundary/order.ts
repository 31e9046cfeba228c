import type { SeparationKind } from './separation.ts';

/** Ties in ln α are broken at this relative difference of α. */
export const TIE = 1e-9;

/** Extremes of a set of trials along one predictor. */
export interface Order {
  lowestHeld: number;
  highestHeld: number;
  lowestSlipped: number;
  highestSlipped: number;
}

export function emptyOrder(): Order {
  return {
    lowestHeld: Infinity,
    highestHeld: -Infinity,
    lowestSlipped: Infinity,
    highestSlipped: -Infinity,
  };
}

/** Adds k slips and h holds at t. */
export function addToOrder(order: Order, t: number, slips: number, holds: number): void {
  if (holds > 0) {
    order.lowestHeld = Math.min(order.lowestHeld, t);
    order.highestHeld = Math.max(order.highestHeld, t);
  }
  if (slips > 0) {
    order.lowestSlipped = Math.min(order.lowestSlipped, t);
    order.highestSlipped = Math.max(order.highestSlipped, t);
  }
}

export function hasBoth(order: Order): boolean {
  return order.highestHeld > -Infinity && order.highestSlipped > -Infinity;
}

/** No hold above any slip (direction 1), or no hold below any slip (direction −1); ties allowed. */
export function weaklyOrdered(order: Order, direction: 1 | -1): boolean {
  return direction > 0
    ? order.highestHeld <= order.lowestSlipped + TIE
    : order.lowestHeld >= order.highestSlipped - TIE;
}

/**
 * Separation by an intercept and one predictor, decided exactly by the order of the trials: some
 * line tells all slips from all holds strictly (complete), or with ties on it (quasi).
 *
 * @source Albert & Anderson 1984, Biometrika 71:1
 */
export function separationAlong(order: Order): SeparationKind {
  if (!hasBoth(order)) return 'complete';
  const { lowestHeld, highestHeld, lowestSlipped, highestSlipped } = order;
  if (highestHeld < lowestSlipped - TIE || lowestHeld > highestSlipped + TIE) return 'complete';
  const oneLevel =
    Math.max(highestHeld, highestSlipped) <= Math.min(lowestHeld, lowestSlipped) + TIE;
  if (oneLevel) return 'none';
  return weaklyOrdered(order, 1) || weaklyOrdered(order, -1) ? 'quasi' : 'none';
}
