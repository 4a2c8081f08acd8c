/** Appears while a page is being fetched. Nothing moves; the words are read out. */
export function Loading() {
  return (
    <p role="status" className="py-10 text-ink2">
      One moment, this is being fetched.
    </p>
  );
}
