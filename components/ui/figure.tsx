'use client';

import { type ReactNode } from 'react';
import { formatQuantity, type Quantity } from '@/lib/units/format';
import { classNames } from './class-names';
import { useUnits } from './units';

export type FigureSize = 'inline' | 'normal' | 'large' | 'cab';

const numberLook: Readonly<Record<FigureSize, string>> = {
  inline: '',
  normal: 'font-mono',
  large: 'text-[1.75rem] font-bold leading-none',
  cab: 'font-mono text-[9.375rem] font-semibold leading-[0.8] tracking-[-0.04em]',
};

const unitLook: Readonly<Record<FigureSize, string>> = {
  inline: 'font-sans text-soft',
  normal: 'font-sans text-[0.875em] text-soft',
  large: 'font-sans text-lg font-semibold',
  cab: 'font-sans text-3xl font-bold',
};

export type FigureProps = Readonly<{
  /** SI; null and undefined show as "none". */
  value: number | null | undefined;
  quantity: Quantity;
  digits?: number;
  signed?: boolean;
  size?: FigureSize;
  /** Leave the unit to the column head (it stays for screen readers). */
  isUnitHidden?: boolean;
  /** What stands for no value: "no reading". */
  none?: ReactNode;
  className?: string;
}>;

/** A number with its unit, in the person's units: SI in, words and figures out. */
export function Figure({
  value,
  quantity,
  digits,
  signed,
  size = 'normal',
  isUnitHidden = false,
  none = 'none',
  className,
}: FigureProps) {
  const system = useUnits();
  if (value === null || value === undefined)
    return <span className={classNames('font-sans text-faint', className)}>{none}</span>;
  const shown = formatQuantity(value, quantity, system, {
    ...(digits === undefined ? {} : { digits }),
    ...(signed === undefined ? {} : { signed }),
  });
  return (
    <span className={classNames('whitespace-nowrap', className)}>
      <span className={numberLook[size]}>{shown.value}</span>
      {shown.unit ? (
        <span className={isUnitHidden ? 'sr-only' : unitLook[size]}>
          {'\u00A0'}
          {shown.unit}
        </span>
      ) : null}
    </span>
  );
}

export type FigureBlockProps = Readonly<{
  label: ReactNode;
  children: ReactNode;
  /** What it is to be read against: "planned 168.9 t". */
  beside?: ReactNode;
  className?: string;
}>;

/** One of the few figures that matter: label, figure, what it stands beside. */
export function FigureBlock({ label, children, beside, className }: FigureBlockProps) {
  return (
    <div className={classNames('grid content-start gap-1', className)}>
      <dt className="text-sm text-soft">{label}</dt>
      <dd className="text-[1.75rem] leading-none font-bold">{children}</dd>
      {beside ? <dd className="text-sm text-faint">{beside}</dd> : null}
    </div>
  );
}
