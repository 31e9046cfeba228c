import { type MarkShape } from './drawing.ts';

const paths: Record<MarkShape, string> = {
  'asterisk-open': 'M8 2v12M2 8h12M3.8 3.8l8.4 8.4M12.2 3.8l-8.4 8.4',
  circle: 'M8 3a5 5 0 1 0 0 10a5 5 0 1 0 0-10z',
  'circle-open': 'M8 3a5 5 0 1 0 0 10a5 5 0 1 0 0-10z',
  'circle-open-dot': 'M8 3a5 5 0 1 0 0 10a5 5 0 1 0 0-10zM8 7.2a.8.8 0 1 0 0 1.6a.8.8 0 1 0 0-1.6z',
  diamond: 'M8 2l6 6l-6 6l-6-6z',
  'diamond-open': 'M8 2l6 6l-6 6l-6-6z',
  'diamond-open-dot': 'M8 2l6 6l-6 6l-6-6zM8 7.2a.8.8 0 1 0 0 1.6a.8.8 0 1 0 0-1.6z',
  square: 'M4 4h8v8h-8z',
  star: 'M8 1.5l1.7 4.6l4.9.2l-3.8 3.1l1.3 4.7l-4.1-2.7l-4.1 2.7l1.3-4.7l-3.8-3.1l4.9-.2z',
  'square-open': 'M3 3h10v10h-10z',
  'triangle-down': 'M2 3.5h12l-6 10z',
  'triangle-down-open': 'M2 3.5h12l-6 10z',
  'triangle-up': 'M2 12.5h12l-6-10z',
  'triangle-up-open': 'M2 12.5h12l-6-10z',
  x: 'M4 2l4 4l4-4l2 2l-4 4l4 4l-2 2l-4-4l-4 4l-2-2l4-4l-4-4z',
  'x-open-dot': 'M4 2l4 4l4-4l2 2l-4 4l4 4l-2 2l-4-4l-4 4l-2-2l4-4l-4-4z',
  'x-thin': 'M3 3l10 10M13 3l-10 10',
};

const filled: ReadonlySet<MarkShape> = new Set([
  'square',
  'star',
  'circle',
  'diamond',
  'triangle-down',
  'triangle-up',
  'x',
]);

/** The same mark as in the pictures, in the text's colour; decoration beside a word. */
export function MarkGlyph({ shape, className = '' }: { shape: MarkShape; className?: string }) {
  return (
    <svg
      viewBox="0 0 16 16"
      aria-hidden="true"
      className={`inline-block size-[0.9em] ${className}`}
    >
      <path
        d={paths[shape]}
        fill={filled.has(shape) ? 'currentColor' : 'none'}
        stroke="currentColor"
        strokeWidth="1.8"
      />
    </svg>
  );
}
