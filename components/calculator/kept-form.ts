import type { Chosen } from '@/lib/explaining/methods/calculator-form';
import type { Cells } from '@/lib/sheet/types';
import type { JudgingTexts } from './judging';

/** What stands in a calculator's form; kept in the browser's session alone, so that a reload loses nothing. */
export interface KeptForm {
  chosen: Chosen;
  judging: JudgingTexts;
  cells: Cells;
}

const place = (slug: string) => `calculator ${slug}`;

/** null: nothing was kept, or the browser keeps nothing. */
export function readKept(slug: string): KeptForm | null {
  try {
    const kept: unknown = JSON.parse(window.sessionStorage.getItem(place(slug)) ?? 'null');
    return kept && typeof kept === 'object' && 'cells' in kept ? (kept as KeptForm) : null;
  } catch {
    return null;
  }
}

export function keep(slug: string, form: KeptForm | null): void {
  try {
    if (form) window.sessionStorage.setItem(place(slug), JSON.stringify(form));
    else window.sessionStorage.removeItem(place(slug));
  } catch {
    // A browser that keeps nothing still calculates.
  }
}
