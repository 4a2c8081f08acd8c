import Link from 'next/link';
import type { Theme } from '@/lib/theme';
import type { NavigationPlace } from './navigation';
import { OrganisationChoice } from './organisation-choice';
import { SignOutButton } from './sign-out-button';
import { ThemeChoice } from './theme-choice';

export interface Person {
  name: string;
  roles: readonly string[];
  organisationName: string;
  otherOrganisations: { id: string; name: string }[];
}

/** Who is signed in, for whom, and what belongs to the person: register pages for the office, light or dark, the way out. */
export function PersonMenu({ person, places, theme }: { person: Person; places: NavigationPlace[]; theme: Theme }) {
  return (
    <>
      <button
        type="button"
        popoverTarget="person-menu"
        className="min-h-12 max-w-64 shrink-0 rounded px-1 text-right text-sm leading-tight text-ink2 hover:text-ink"
      >
        <span className="block truncate">
          <span className="text-ink">{person.name}</span> · {person.roles.join(', ')}
        </span>
        <span className="block truncate">
          {person.organisationName} <span aria-hidden="true">▾</span>
        </span>
      </button>
      <div
        id="person-menu"
        popover="auto"
        className="absolute inset-auto right-5 top-14 m-0 w-72 rounded border-[1.5px] border-ink bg-leaf p-4 text-ink"
      >
        <div className="grid gap-4">
          {places.length > 0 && (
            <ul>
              {places.map(({ href, label }) => (
                <li key={href}>
                  <Link href={href} className="flex min-h-10 items-center text-blue underline">
                    {label}
                  </Link>
                </li>
              ))}
            </ul>
          )}
          {person.otherOrganisations.length > 0 && <OrganisationChoice organisations={person.otherOrganisations} />}
          <ThemeChoice chosen={theme} />
          <SignOutButton />
        </div>
      </div>
    </>
  );
}
