import { Link } from 'react-router-dom';
import type { Waiting } from '#src/features/home/api/home.ts';

/** One line a thing to do, the number first: the eye runs down the figures. */
export function WaitingList({ items }: { items: readonly Waiting[] }) {
  return (
    <ul>
      {items.map((item) => (
        <li key={item.key} className="border-b border-hairline">
          <Link
            to={item.to}
            className="grid grid-cols-[4rem_1fr_auto] items-baseline gap-x-4 px-gutter py-3.5 hover:bg-sheet"
          >
            <span className="text-right text-display font-semibold">
              {item.count.toLocaleString('en-US')}
            </span>
            <span>
              <span className="block text-lead font-semibold">{item.title}</span>
              {item.detail ? <span className="block text-ink-2">{item.detail}</span> : null}
            </span>
            <svg
              viewBox="0 0 8 12"
              width="8"
              height="12"
              aria-hidden="true"
              className="fill-none stroke-accent"
            >
              <path d="m1.5 1 5 5-5 5" strokeWidth="1.6" />
            </svg>
          </Link>
        </li>
      ))}
    </ul>
  );
}
