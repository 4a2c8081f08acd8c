import type { ReactNode } from 'react';

/** One stamped field of the plate. */
export interface NameplateField {
  label: string;
  value: ReactNode;
  /** The serial number: mono and large, since it is read aloud. */
  serial?: boolean;
}

/**
 * An engraved plate with two screws, at the head of everything that belongs to one machine. `children` stand at its right end (an
 * action, a state).
 */
export function Nameplate(props: { fields: NameplateField[]; children?: ReactNode; className?: string }) {
  return (
    <div
      className={`flex items-center gap-3 rounded border-[1.5px] border-ink bg-leaf px-3 py-2.5 ${props.className ?? ''}`}
    >
      <Screw />
      <dl className="flex min-w-0 flex-1 flex-wrap items-end gap-x-7 gap-y-2">
        {props.fields.map((field) => (
          <div key={field.label} className="min-w-0">
            <dt className="text-xs leading-4 text-ink2">{field.label}</dt>
            <dd className={field.serial ? 'break-all font-mono text-xl leading-6' : 'font-semibold leading-6'}>
              {field.value}
            </dd>
          </div>
        ))}
      </dl>
      {props.children}
      <Screw />
    </div>
  );
}

function Screw() {
  return (
    <svg width="13" height="13" viewBox="0 0 13 13" aria-hidden="true" focusable="false" className="shrink-0">
      <circle cx="6.5" cy="6.5" r="5" fill="none" stroke="var(--ink)" strokeWidth="1.5" />
      <path d="M3.2 3.2L9.8 9.8" stroke="var(--ink)" strokeWidth="2" />
    </svg>
  );
}
