import type { Data, Layout } from 'plotly.js';

/** What a drawing function hands to `Plot`: traces back to front, and the layout they need. */
export interface Drawing {
  data: Data[];
  layout: Partial<Layout>;
}

/** The shapes in use; a state is told apart by its shape, its colour only repeats it. */
export type MarkShape =
  | 'asterisk-open'
  | 'circle'
  | 'circle-open'
  | 'circle-open-dot'
  | 'diamond'
  | 'diamond-open'
  | 'diamond-open-dot'
  | 'square'
  | 'square-open'
  | 'star'
  | 'triangle-down'
  | 'triangle-down-open'
  | 'triangle-up'
  | 'triangle-up-open'
  | 'x'
  | 'x-open-dot'
  | 'x-thin';
