import type { ReactNode } from 'react';

/** blue: for your information or done; brass: waits for you, take care; oxide: refused or lost. The word says it, colour only underlines. */
export type NoticeTone = 'blue' | 'brass' | 'oxide';

const tones: Record<NoticeTone, { box: string; word: string; ink: string }> = {
  blue: { box: 'border-blue bg-blue-wash', word: 'Note', ink: 'text-blue' },
  brass: { box: 'border-brass bg-brass-wash', word: 'Take note', ink: 'text-brass' },
  oxide: { box: 'border-oxide bg-oxide-wash', word: 'Not done', ink: 'text-oxide' },
};

export function Notice(props: {
  tone?: NoticeTone;
  title?: string;
  /** Read out at once, because it answers something the reader just did. */
  live?: boolean;
  className?: string;
  children?: ReactNode;
}) {
  const { tone = 'blue', title, live, className = '', children } = props;
  const look = tones[tone];
  return (
    <div
      role={live ? (tone === 'oxide' ? 'alert' : 'status') : undefined}
      className={`border-l-4 px-4 py-3 ${look.box} ${className}`}
    >
      <p className={`font-semibold ${look.ink}`}>{title ?? look.word}</p>
      {children && <div className="mt-0.5">{children}</div>}
    </div>
  );
}
