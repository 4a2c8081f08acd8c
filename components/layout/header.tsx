import Link from 'next/link';
import { Suspense } from 'react';
import type { Theme } from '@/lib/theme';
import { Brand } from './brand';
import { Navigation, type NavigationPlace } from './navigation';
import { type Person, PersonMenu } from './person-menu';
import { SaveStateSlot } from './save-state';
import { SearchBox } from './search-box';

/** One line on a desk, two on a tablet; the search is in both. */
export function Header(props: { person: Person; places: NavigationPlace[]; office: NavigationPlace[]; theme: Theme }) {
  const { person, places, office, theme } = props;
  return (
    <header data-print="no" className="relative border-b border-line px-5">
      <div className="flex flex-wrap items-center gap-x-6 gap-y-1 py-1">
        <Link href="/" className="inline-flex min-h-12 items-center">
          <Brand />
        </Link>
        <div className="order-3 w-full xl:order-none xl:w-auto">
          <Navigation places={places} />
        </div>
        <div className="ml-auto flex min-w-0 flex-1 items-center justify-end gap-x-5 text-sm max-sm:contents">
          <SaveStateSlot />
          {/* On a telephone the box has a line of its own. */}
          <div className="flex min-w-0 flex-1 justify-end max-sm:order-2 max-sm:w-full max-sm:flex-none">
            <Suspense>
              <SearchBox />
            </Suspense>
          </div>
          <div className="max-sm:ml-auto">
            <PersonMenu person={person} places={office} theme={theme} />
          </div>
        </div>
      </div>
    </header>
  );
}
