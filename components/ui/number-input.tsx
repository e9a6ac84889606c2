'use client';

import { type ChangeEvent, useState } from 'react';
import { formatNumber, parseQuantity, type Quantity } from '@/lib/units/format';
import { toDisplay, unitLabel } from '@/lib/units/quantity';
import { classNames } from './class-names';
import { useField } from './field';
import { inputLook } from './input-look';
import { useUnits } from './units';

export type NumberInputProps = Readonly<{
  /** Name of the form field; what is sent under it is SI. */
  name?: string;
  quantity: Quantity;
  /** SI */
  defaultValue?: number | null | undefined;
  /** Decimals of the first text; what is typed stays as typed. */
  digits?: number;
  /** The SI value as it is typed; null while it is no number. */
  onValue?: (value: number | null) => void;
  className?: string;
  required?: boolean;
  autoFocus?: boolean;
  'aria-label'?: string;
}>;

const trimmed = (value: number, digits: number) =>
  formatNumber(value, digits)
    .replace(/(\.\d*?)0+$/, '$1')
    .replace(/\.$/, '')
    .replaceAll('\u202F', '');

/** A number typed in the person's units, sent in SI. What cannot be read is sent as typed, for the form's check to name. */
export function NumberInput({
  name,
  quantity,
  defaultValue,
  digits = 4,
  onValue,
  className,
  ...rest
}: NumberInputProps) {
  const system = useUnits();
  const field = useField();
  const [text, setText] = useState(() =>
    defaultValue === null || defaultValue === undefined
      ? ''
      : trimmed(toDisplay(defaultValue, quantity, system), digits),
  );
  const [isTouched, setIsTouched] = useState(false);
  const parsed = parseQuantity(text, quantity, system);
  // A value nobody touched goes back as it came: shown in pounds and back would move it by a rounding.
  const typed = parsed.ok ? String(parsed.value) : text;
  const sent = isTouched || defaultValue === null || defaultValue === undefined ? typed : String(defaultValue);
  const unit = unitLabel(quantity, system);
  const type = (event: ChangeEvent<HTMLInputElement>) => {
    setText(event.target.value);
    setIsTouched(true);
    const next = parseQuantity(event.target.value, quantity, system);
    onValue?.(next.ok ? next.value : null);
  };
  return (
    <span className={classNames('flex min-w-0 items-center gap-2', className)}>
      <input
        {...field}
        {...rest}
        inputMode="decimal"
        autoComplete="off"
        value={text}
        onChange={type}
        className={classNames(inputLook, 'text-right font-mono')}
      />
      {unit ? <span className="shrink-0 text-sm text-soft">{unit}</span> : null}
      {name ? <input type="hidden" name={name} value={sent} /> : null}
    </span>
  );
}
