'use client';

import Form from 'next/form';
import { usePathname, useSearchParams } from 'next/navigation';

/** The one box of the archive, on every page. A single exact hit opens its machine; everything else lists. */
export function SearchBox() {
  const q = useSearchParams().get('q');
  const shown = usePathname() === '/archive' ? (q ?? '') : '';
  return (
    <Form action="/archive" role="search" className="flex w-full min-w-0 max-w-sm max-sm:max-w-none">
      <label className="sr-only" htmlFor="search">
        Look up in the archive
      </label>
      <input
        // Drawn anew when the search changes, so that it shows what was looked for.
        key={shown}
        id="search"
        name="q"
        type="search"
        defaultValue={shown}
        required
        autoComplete="off"
        spellCheck={false}
        placeholder="Serial number, any part"
        className="min-h-12 w-full min-w-0 rounded-l border-[1.5px] border-ink2 bg-leaf px-3 font-mono text-[15px] placeholder:font-sans focus:border-blue"
      />
      <input type="hidden" name="open" value="1" />
      <button
        type="submit"
        className="-ml-[1.5px] min-h-12 whitespace-nowrap rounded-r border-[1.5px] border-ink2 px-3.5 text-[15px] font-medium hover:bg-blue-wash"
      >
        Look up
      </button>
    </Form>
  );
}
