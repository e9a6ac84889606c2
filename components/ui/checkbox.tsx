'use client';

import { type ComponentProps, type ReactNode, useId } from 'react';
import { classNames } from './class-names';

export type CheckboxProps = Readonly<Omit<ComponentProps<'input'>, 'type'> & { label: ReactNode; hint?: ReactNode }>;

export function Checkbox({ label, hint, className, ...rest }: CheckboxProps) {
  const id = useId();
  return (
    <div className={classNames('flex items-start gap-2.5', className)}>
      <input
        {...rest}
        id={id}
        type="checkbox"
        aria-describedby={hint ? `${id}-hint` : undefined}
        className="mt-0.5 size-[1.125rem] shrink-0 accent-lamp"
      />
      <div className="min-w-0">
        <label htmlFor={id}>{label}</label>
        {hint ? (
          <p id={`${id}-hint`} className="text-sm text-faint">
            {hint}
          </p>
        ) : null}
      </div>
    </div>
  );
}
