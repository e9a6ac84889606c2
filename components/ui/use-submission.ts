'use client';

import { type FormEvent, useState, useTransition } from 'react';
import { type ActionResult, type ProblemFields, type ProblemView } from '@/lib/problem';

interface Submission<T> {
  /** Sends; gives the result back too, for whoever waits for it. */
  send: (input: unknown) => void;
  /** For `<form onSubmit>`: sends the fields by their names, as text. */
  submit: (event: FormEvent<HTMLFormElement>) => void;
  isSending: boolean;
  problem: ProblemView | null;
  /** Field name → what is wrong with it. */
  fields: ProblemFields;
  /** What came back from the last success. */
  done: T | null;
}

const unreachable: ProblemView = {
  code: 'busy',
  status: 503,
  title: 'The server could not be reached.',
  detail: 'What you typed is still here. Check the connection and send again.',
  fields: {},
};

/** A server action with what a form shows about it: sending, refused and why, done. */
export function useSubmission<T>(
  act: (input: never) => Promise<ActionResult<T>>,
  onDone?: (result: T) => void,
  onRefused?: (problem: ProblemView) => void,
): Submission<T> {
  const [isSending, startTransition] = useTransition();
  const [state, setState] = useState<{ problem: ProblemView | null; done: T | null }>({ problem: null, done: null });
  const send = (input: unknown) =>
    startTransition(async () => {
      try {
        const result = await act(input as never);
        setState(result.ok ? { problem: null, done: result.data } : { problem: result.problem, done: null });
        if (result.ok) onDone?.(result.data);
        else onRefused?.(result.problem);
      } catch {
        setState({ problem: unreachable, done: null });
        onRefused?.(unreachable);
      }
    });
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    send(Object.fromEntries(new FormData(event.currentTarget)));
  };
  return { send, submit, isSending, problem: state.problem, fields: state.problem?.fields ?? {}, done: state.done };
}
