'use client';

import { type ComponentProps, type MouseEvent, useId } from 'react';
import { buttonLook, type ButtonSize, type ButtonVariant } from './button-look';

export type ButtonProps = Readonly<
  Omit<ComponentProps<'button'>, 'disabled'> & {
    variant?: ButtonVariant;
    size?: ButtonSize;
    /** Why it cannot be used now, as a sentence. The button stays reachable, so that the reason can be heard. */
    disabledReason?: string | null | undefined;
    isBusy?: boolean;
    /** What it says while busy: "Saving". */
    busyLabel?: string;
  }
>;

export function Button({
  variant = 'outline',
  size = 'normal',
  disabledReason,
  isBusy = false,
  busyLabel,
  className,
  children,
  onClick,
  type = 'button',
  ...rest
}: ButtonProps) {
  const reasonId = useId();
  const isOff = isBusy || Boolean(disabledReason);
  const press = (event: MouseEvent<HTMLButtonElement>) => {
    if (isOff) event.preventDefault();
    else onClick?.(event);
  };
  return (
    <>
      <button
        {...rest}
        type={type}
        className={buttonLook(variant, size, Boolean(disabledReason), className)}
        aria-disabled={isOff || undefined}
        aria-busy={isBusy || undefined}
        title={disabledReason ?? rest.title}
        aria-describedby={disabledReason ? reasonId : rest['aria-describedby']}
        onClick={press}
      >
        {isBusy ? (busyLabel ?? children) : children}
      </button>
      {disabledReason ? (
        <span id={reasonId} hidden>
          {disabledReason}
        </span>
      ) : null}
    </>
  );
}
