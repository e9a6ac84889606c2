'use client';

import { useId } from 'react';
import { classNames } from './class-names';

export type SegmentedProps<Value extends string> = Readonly<{
  label: string;
  options: readonly { value: Value; label: string }[];
  /** Give `value` and `onChange`, or `defaultValue` and `name` inside a form. */
  value?: Value;
  defaultValue?: Value;
  name?: string;
  onChange?: (value: Value) => void;
  isLabelHidden?: boolean;
  size?: 'normal' | 'cab';
  className?: string;
}>;

/** One of a few, all of them in view: a radio group. */
export function Segmented<Value extends string>({
  label,
  options,
  value,
  defaultValue,
  name,
  onChange,
  isLabelHidden = false,
  size = 'normal',
  className,
}: SegmentedProps<Value>) {
  const ownName = useId();
  return (
    <fieldset className={classNames('min-w-0', className)}>
      <legend className={isLabelHidden ? 'sr-only' : 'mb-1 text-sm text-soft'}>{label}</legend>
      <div className="inline-flex max-w-full flex-wrap rounded-md border border-line bg-panel p-0.5">
        {options.map((option) => (
          <label
            key={option.value}
            className={classNames(
              'relative flex cursor-pointer items-center justify-center rounded-[0.25rem] px-3 text-soft transition-colors hover:text-ink has-checked:bg-raised has-checked:font-semibold has-checked:text-ink has-checked:shadow-[inset_0_-2px_0_var(--lamp)] has-focus-visible:outline-2 has-focus-visible:outline-offset-1 has-focus-visible:outline-ink',
              size === 'cab' ? 'min-h-16 px-5 text-xl' : 'min-h-8',
            )}
          >
            <input
              type="radio"
              name={name ?? ownName}
              value={option.value}
              className="absolute inset-0 cursor-pointer appearance-none outline-none"
              {...(value === undefined
                ? { defaultChecked: option.value === defaultValue }
                : { checked: option.value === value })}
              onChange={() => onChange?.(option.value)}
            />
            {option.label}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
