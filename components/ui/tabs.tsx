'use client';

import type { ReactNode } from 'react';

export interface TabChoice<K extends string> {
  key: K;
  label: string;
  /** A figure or a word beside the label: what this tab holds at the moment. */
  note?: ReactNode;
}

const look = (chosen: boolean) =>
  `inline-flex min-h-12 min-w-6 items-center justify-center gap-1.5 border-b-[3px] px-0.5 ${chosen ? 'border-blue font-semibold text-ink' : 'border-transparent text-ink2 hover:border-line'}`;

/** Words with a line under the chosen one. For panels in one page; the panel is tied to it by `panelId`. */
export function Tabs<K extends string>(props: {
  label: string;
  choices: TabChoice<K>[];
  chosen: K;
  onChoose: (key: K) => void;
  panelId: string;
}) {
  const { choices, chosen, onChoose, panelId } = props;
  const step = (by: number) => {
    const at = choices.findIndex((choice) => choice.key === chosen);
    const next = choices[(at + by + choices.length) % choices.length];
    if (!next) return;
    onChoose(next.key);
    document.getElementById(`${panelId}-${next.key}`)?.focus();
  };
  return (
    <div
      role="tablist"
      aria-label={props.label}
      className="flex flex-wrap gap-x-5"
      onKeyDown={(event) => {
        if (event.key === 'ArrowRight') step(1);
        if (event.key === 'ArrowLeft') step(-1);
      }}
    >
      {choices.map((choice) => (
        <button
          key={choice.key}
          id={`${panelId}-${choice.key}`}
          type="button"
          role="tab"
          aria-selected={choice.key === chosen}
          aria-controls={panelId}
          tabIndex={choice.key === chosen ? 0 : -1}
          className={look(choice.key === chosen)}
          onClick={() => onChoose(choice.key)}
        >
          {choice.label}
          {choice.note}
        </button>
      ))}
    </div>
  );
}
