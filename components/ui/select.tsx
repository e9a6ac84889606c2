'use client';

import { type ComponentProps } from 'react';
import { classNames } from './class-names';
import { useField } from './field';
import { inputLook } from './input-look';

export interface SelectOption {
  value: string;
  label: string;
  isDisabled?: boolean;
}

export type SelectProps = Readonly<ComponentProps<'select'> & { options: readonly SelectOption[] }>;

export function Select({ options, className, ...rest }: SelectProps) {
  return (
    <span className={classNames('relative block min-w-0', className)}>
      <select {...useField()} {...rest} className={classNames(inputLook, 'appearance-none truncate pr-8')}>
        {options.map((option) => (
          <option key={option.value} value={option.value} disabled={option.isDisabled}>
            {option.label}
          </option>
        ))}
      </select>
      <svg
        aria-hidden
        viewBox="0 0 12 12"
        className="pointer-events-none absolute top-1/2 right-2.5 size-3 -translate-y-1/2 fill-none stroke-soft stroke-[1.5]"
      >
        <path d="M2.5 4.5 6 8l3.5-3.5" />
      </svg>
    </span>
  );
}
