'use client';

import { type FormEvent, useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import type { ProblemDetails } from '@/lib/problem-details';

/**
 * One form, one request: reads the fields, waits, and keeps what went wrong. After a success it stays
 * busy, because the page is on its way elsewhere.
 */
export function useFormRequest(
  request: (fields: Record<string, string>) => Promise<void>,
  onDone: () => void,
) {
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<ProblemDetails | null>(null);

  const run = async (fields: Record<string, string>) => {
    setIsBusy(true);
    setProblem(null);
    try {
      await request(fields);
      onDone();
    } catch (caught) {
      setProblem(problemOf(caught));
      setIsBusy(false);
    }
  };
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (!isBusy) run(readFields(event.currentTarget));
  };
  const errorOf = (field: string) => problem?.errors?.[field];
  /** For a form that stays on the screen after its success. */
  const rest = () => setIsBusy(false);
  return { isBusy, problem, run, submit, errorOf, rest };
}

function readFields(form: HTMLFormElement): Record<string, string> {
  const fields: Record<string, string> = {};
  for (const [name, value] of new FormData(form)) {
    if (typeof value === 'string') fields[name] = value;
  }
  return fields;
}
