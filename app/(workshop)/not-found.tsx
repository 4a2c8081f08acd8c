import { LinkButton } from '@/components/ui/button';

export default function NothingHere() {
  return (
    <div className="max-w-prose py-8">
      <h1 className="text-2xl font-semibold">There is nothing here</h1>
      <p className="mt-2">
        Either it does not exist, or it is not yours to see. The search finds every machine by its serial number.
      </p>
      <div className="mt-5">
        <LinkButton href="/archive" variant="strong">
          Look a machine up
        </LinkButton>
      </div>
    </div>
  );
}
