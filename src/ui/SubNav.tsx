import { NavLink } from 'react-router';

/** The places of one thing, side by side; the present one is marked for everybody. */
export function SubNav({
  label,
  items,
}: {
  label: string;
  items: { to: string; text: string; end?: boolean }[];
}) {
  return (
    <nav
      aria-label={label}
      className="-mx-4 mb-6 overflow-x-auto border-b border-line px-4 print:hidden"
    >
      <ul className="flex gap-1">
        {items.map(({ to, text, end = false }) => (
          <li key={to}>
            <NavLink
              to={to}
              end={end}
              className="block border-b-2 border-transparent px-3 py-2 whitespace-nowrap text-ink no-underline hover:bg-hover aria-[current=page]:border-accent aria-[current=page]:font-bold aria-[current=page]:text-accent"
            >
              {text}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}
