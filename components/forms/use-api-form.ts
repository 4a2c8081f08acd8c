'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useRef, useState } from 'react';
import { type DefaultValues, type FieldValues, type Path, type UseFormReturn, useForm } from 'react-hook-form';
import type { z } from 'zod';
import { ApiProblem } from '@/lib/http/api-client';
import { newId } from '@/lib/id';

export interface ApiForm<I extends FieldValues, O> {
  form: UseFormReturn<I, unknown, O>;
  /** For `<form onSubmit>`. */
  submit: (event?: React.BaseSyntheticEvent) => Promise<void>;
  /** What belongs to no field: a lost connection, a refusal as a whole. */
  problem: ApiProblem | null;
  sending: boolean;
  /** Message at a field, whether the browser or the server found it. */
  errorAt: (path: Path<I>) => string | undefined;
}

/**
 * A form that the browser and the server check by the same schema. The server's problems appear at their field; nothing typed is
 * lost; a second press while it is on its way does nothing, and a repetition after a lost answer carries the same key, so that it
 * happens once.
 */
export function useApiForm<S extends z.ZodType<FieldValues, FieldValues>, T = unknown>(options: {
  schema: S;
  defaultValues: DefaultValues<z.input<S>>;
  /** Puts in what follows from the other fields, before the schema looks at it. */
  prepare?: (values: z.input<S>) => z.input<S>;
  send: (values: z.output<S>, idempotencyKey: string) => Promise<T>;
  onDone?: (answer: T, values: z.output<S>) => void | Promise<void>;
}): ApiForm<z.input<S>, z.output<S>> {
  type I = z.input<S>;
  type O = z.output<S>;
  const { schema, defaultValues, prepare, send, onDone } = options;
  const checked = zodResolver(schema as unknown as z.ZodType<O, I>);
  const form = useForm<I, unknown, O>({
    defaultValues,
    resolver: prepare ? (values, ...rest) => checked(prepare(values), ...rest) : checked,
  });
  const [problem, setProblem] = useState<ApiProblem | null>(null);
  const attempt = useRef<{ body: string; key: string } | null>(null);
  const busy = useRef(false);

  const submit = form.handleSubmit(async (values) => {
    if (busy.current) return;
    busy.current = true;
    setProblem(null);
    const body = JSON.stringify(values);
    if (attempt.current?.body !== body) attempt.current = { body, key: newId() };
    try {
      const answer = await send(values, attempt.current.key);
      attempt.current = null;
      await onDone?.(answer, values);
    } catch (error) {
      if (!(error instanceof ApiProblem)) throw error;
      setProblem(placeErrors(form, error));
    } finally {
      busy.current = false;
    }
  });

  return {
    form,
    submit,
    problem,
    sending: form.formState.isSubmitting,
    errorAt: (path) => {
      // What is wrong with a list as a whole stands at its root.
      const error = form.getFieldState(path, form.formState).error;
      return error?.message ?? error?.root?.message;
    },
  };
}

/** Puts each error at the field its pointer names; what names no known field stays with the problem. */
function placeErrors<I extends FieldValues, O>(
  form: UseFormReturn<I, unknown, O>,
  problem: ApiProblem,
): ApiProblem | null {
  const elsewhere = problem.errors.filter(({ pointer, detail }) => {
    const path = pointer.slice(1).replaceAll('/', '.').replaceAll('~1', '/').replaceAll('~0', '~') as Path<I>;
    if (!pointer || form.getValues(path) === undefined) return true;
    form.setError(path, { message: detail });
    return false;
  });
  if (problem.errors.length > 0 && elsewhere.length === 0) return null;
  return problem;
}
