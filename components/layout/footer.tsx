import { version } from '@/lib/version';
import { Keys } from './keys';

export function Footer() {
  return (
    <footer data-print="no" className="mt-auto flex flex-wrap items-center gap-x-5 px-7 py-4 text-sm text-ink2">
      <span>Witnessmark {version}</span>
      <Keys />
    </footer>
  );
}
