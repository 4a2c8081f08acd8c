import { Brand } from '@/components/layout/brand';
import { LinkButton } from '@/components/ui/button';

export default function NotFound() {
  return (
    <main className="mx-auto grid max-w-prose gap-4 px-5 py-16">
      <Brand />
      <h1 className="text-2xl font-semibold">There is no such page</h1>
      <p>The address may be mistyped, or the page has moved.</p>
      <div>
        <LinkButton href="/" variant="strong">
          Go to the start
        </LinkButton>
      </div>
    </main>
  );
}
