'use client';

import { createContext, type ReactNode, useContext, useId } from 'react';
import { classNames } from './class-names';

interface FieldLinks {
  id: string;
  describedBy: string | undefined;
  isInvalid: boolean;
}

const FieldContext = createContext<FieldLinks | null>(null);

/** What an input inside a `<Field>` takes from it: its id, and what describes it. */
export function useField(): { id?: string; 'aria-describedby'?: string; 'aria-invalid'?: true } {
  const links = useContext(FieldContext);
  if (!links) return {};
  return {
    id: links.id,
    ...(links.describedBy ? { 'aria-describedby': links.describedBy } : {}),
    ...(links.isInvalid ? { 'aria-invalid': true as const } : {}),
  };
}

export type FieldProps = Readonly<{
  label: ReactNode;
  hint?: ReactNode;
  /** What is wrong with it, as a sentence. */
  error?: string | undefined;
  children: ReactNode;
  className?: string;
  /** For a label that the surroundings already show. */
  isLabelHidden?: boolean;
}>;

export function Field({ label, hint, error, children, className, isLabelHidden = false }: FieldProps) {
  const id = useId();
  const hintId = `${id}-hint`;
  const errorId = `${id}-error`;
  const describedBy = [hint ? hintId : '', error ? errorId : ''].filter(Boolean).join(' ') || undefined;
  return (
    <FieldContext value={{ id, describedBy, isInvalid: Boolean(error) }}>
      <div className={classNames('grid content-start gap-1', className)}>
        <label htmlFor={id} className={isLabelHidden ? 'sr-only' : 'text-sm text-soft'}>
          {label}
        </label>
        {children}
        {hint ? (
          <p id={hintId} className="text-sm text-faint">
            {hint}
          </p>
        ) : null}
        {error ? (
          <p id={errorId} className="text-sm font-semibold text-frozen">
            {error}
          </p>
        ) : null}
      </div>
    </FieldContext>
  );
}
