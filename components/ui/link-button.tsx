import Link from 'next/link';
import { type ComponentProps } from 'react';
import { buttonLook, type ButtonSize, type ButtonVariant } from './button-look';

export type LinkButtonProps = Readonly<
  ComponentProps<typeof Link> & {
    variant?: ButtonVariant;
    size?: ButtonSize;
  }
>;

/** A link that leads on like an action does. For files use `<DownloadLink>`: the router must not fetch them. */
export function LinkButton({ variant = 'outline', size = 'normal', className, ...rest }: LinkButtonProps) {
  return <Link {...rest} className={buttonLook(variant, size, false, className)} />;
}

export type DownloadLinkProps = Readonly<ComponentProps<'a'> & { variant?: ButtonVariant; size?: ButtonSize }>;

export function DownloadLink({ variant = 'outline', size = 'normal', className, ...rest }: DownloadLinkProps) {
  return <a {...rest} download={rest.download ?? true} className={buttonLook(variant, size, false, className)} />;
}
