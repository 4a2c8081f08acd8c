'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';

export interface NavigationPlace {
  href: string;
  label: string;
}

/** The rooms of the workshop; where I am is told by weight and a line, and to a screen reader as the current page. */
export function Navigation({ places }: { places: NavigationPlace[] }) {
  const here = usePathname();
  return (
    <nav aria-label="Rooms">
      <ul className="flex flex-wrap gap-x-5">
        {places.map(({ href, label }) => {
          const current = here === href || here.startsWith(`${href}/`);
          return (
            <li key={href}>
              <Link
                href={href}
                aria-current={current ? 'page' : undefined}
                className={`inline-flex min-h-12 items-center border-b-[3px] ${current ? 'border-blue font-semibold' : 'border-transparent text-ink2 hover:text-ink'}`}
              >
                {label}
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
