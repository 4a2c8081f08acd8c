'use client';

import { useState } from 'react';
import { type Theme, themeCookie, themes } from '@/lib/theme';

const words: Record<Theme, string> = { system: 'As the device', light: 'Light', dark: 'Dark' };
const yearSeconds = 31_536_000;

/** Kept in a cookie, so that the server draws the page in it at once. */
export function ThemeChoice({ chosen }: { chosen: Theme }) {
  const [theme, setTheme] = useState(chosen);
  const choose = (next: Theme) => {
    setTheme(next);
    if (next === 'system') delete document.documentElement.dataset.theme;
    else document.documentElement.dataset.theme = next;
    // biome-ignore lint/suspicious/noDocumentCookie: the cookie store interface is missing in Firefox and Safari
    document.cookie = `${themeCookie}=${next}; path=/; max-age=${yearSeconds}; samesite=lax`;
  };
  return (
    <fieldset>
      <legend className="text-sm text-ink2">Light or dark</legend>
      <div className="mt-1 flex flex-wrap gap-1">
        {themes.map((each) => (
          <button
            key={each}
            type="button"
            aria-pressed={each === theme}
            onClick={() => choose(each)}
            className={`min-h-10 rounded border-[1.5px] px-3 text-sm ${each === theme ? 'border-blue bg-blue-wash font-semibold text-blue' : 'border-line'}`}
          >
            {words[each]}
          </button>
        ))}
      </div>
    </fieldset>
  );
}
