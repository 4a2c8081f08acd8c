/** Box of a drawn signature's strokes, in their own units. */
export const strokeBox = { width: 600, height: 200 };

/** What stands above the line: the drawn strokes, or the typed name. */
export function SignatureMark({ strokes, typed }: { strokes: string[] | null; typed: string | null }) {
  if (strokes?.length) {
    return (
      <svg
        viewBox={`0 0 ${strokeBox.width} ${strokeBox.height}`}
        role="img"
        aria-label="Signature, drawn by hand"
        className="h-20 w-full max-w-60"
      >
        {strokes.map((d, index) => (
          <path key={index} d={d} fill="none" stroke="var(--ink)" strokeWidth="4" strokeLinecap="round" />
        ))}
      </svg>
    );
  }
  return <p className="flex h-20 items-end text-2xl">{typed ?? ''}</p>;
}
