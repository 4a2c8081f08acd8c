import { Notice } from '@/components/ui/notice';
import type { ApiProblem } from '@/lib/http/api-client';

/** Above the button that was pressed: what was refused as a whole, and the id when it was our fault. */
export function FormProblem({ problem }: { problem: ApiProblem | null }) {
  if (!problem) return null;
  return (
    <Notice tone="oxide" title={problem.title} live>
      <p>{problem.detail}</p>
    </Notice>
  );
}
