'use client';

import { type FormEvent, type ReactNode } from 'react';
import { type ProblemFields, type ProblemView } from '@/lib/problem';
import { Button } from './button';
import { classNames } from './class-names';
import { Notice } from './notice';

/** The part of `useSubmission` that a form needs. */
export interface FormSubmission {
  submit: (event: FormEvent<HTMLFormElement>) => void;
  send: (input: unknown) => void;
  isSending: boolean;
  problem: ProblemView | null;
  fields: ProblemFields;
}

export type FormProps = Readonly<{
  submission: FormSubmission;
  /** The fields by name → what is sent; without it, the fields as they are. */
  toInput?: (fields: Record<string, FormDataEntryValue>) => unknown;
  submitLabel: string;
  busyLabel?: string;
  disabledReason?: string | null;
  /** Names of fields that show their own error; the others' are listed above the button. */
  shownFields: readonly string[];
  isPrimary?: boolean;
  /** Buttons beside the first. */
  actions?: ReactNode;
  children: ReactNode;
  className?: string;
}>;

/** Fields, what was refused and why, and the button that sends. */
export function Form({
  submission,
  toInput,
  submitLabel,
  busyLabel = 'Saving',
  disabledReason,
  shownFields,
  isPrimary = true,
  actions,
  children,
  className,
}: FormProps) {
  const { problem, isSending } = submission;
  const send = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const fields = Object.fromEntries(new FormData(event.currentTarget));
    submission.send(toInput ? toInput(fields) : fields);
  };
  const others = Object.entries(problem?.fields ?? {}).filter(([name]) => !shownFields.includes(name));
  return (
    <form onSubmit={send} noValidate className={classNames('grid gap-4', className)}>
      {children}
      {problem ? (
        <Notice tone="problem" title={problem.title} todo={problem.detail}>
          {others.length > 0 ? others.map(([name, sentence]) => <p key={name}>{sentence}</p>) : null}
        </Notice>
      ) : null}
      <div className="flex flex-wrap items-center gap-2.5">
        <Button
          type="submit"
          variant={isPrimary ? 'primary' : 'outline'}
          isBusy={isSending}
          busyLabel={busyLabel}
          disabledReason={disabledReason}
        >
          {submitLabel}
        </Button>
        {actions}
      </div>
    </form>
  );
}
