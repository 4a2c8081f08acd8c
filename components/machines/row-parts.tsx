'use client';

import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { FieldErrorLine } from '@/components/ui/field';

/** One list of the make-up: heading, a table of small fields, and what is wrong with a row under it. */
export function PartTable(props: {
  title: string;
  hint?: string;
  heads: string[];
  addLabel: string;
  onAdd: () => void;
  problem?: string;
  isEmpty?: boolean;
  children: ReactNode;
}) {
  const { title, hint, heads, addLabel, onAdd, problem, isEmpty, children } = props;
  return (
    <fieldset className="min-w-0">
      <legend className="font-semibold">{title}</legend>
      {hint && <p className="text-sm text-ink2">{hint}</p>}
      {!isEmpty && (
        <div className="overflow-x-auto">
          <table className="mt-1 border-collapse">
            <thead>
              <tr className="border-b-[1.5px] border-ink">
                {heads.map((head) => (
                  <th key={head} scope="col" className="py-1 pr-2 text-left text-sm font-medium text-ink2">
                    {head}
                  </th>
                ))}
                <th scope="col">
                  <span className="sr-only">Take out</span>
                </th>
              </tr>
            </thead>
            <tbody>{children}</tbody>
          </table>
        </div>
      )}
      {problem && <FieldErrorLine>{problem}</FieldErrorLine>}
      <Button small className="mt-2" onClick={onAdd}>
        {addLabel}
      </Button>
    </fieldset>
  );
}

export function PartRow(props: {
  name: string;
  onRemove?: () => void;
  messages: string[];
  columns: number;
  children: ReactNode;
}) {
  const { name, onRemove, messages, columns, children } = props;
  return (
    <>
      <tr>
        {children}
        <td className="py-1 text-right">
          {onRemove && (
            <Button
              small
              variant="quiet"
              className="whitespace-nowrap"
              aria-label={`Take out ${name}`}
              onClick={onRemove}
            >
              Take out
            </Button>
          )}
        </td>
      </tr>
      {messages.length > 0 && (
        <tr>
          <td colSpan={columns + 1} className="pb-2">
            {messages.map((message) => (
              <FieldErrorLine key={message}>{message}</FieldErrorLine>
            ))}
          </td>
        </tr>
      )}
    </>
  );
}

export function PartCell({ children }: { children: ReactNode }) {
  return <td className="py-1 pr-2 align-middle">{children}</td>;
}
