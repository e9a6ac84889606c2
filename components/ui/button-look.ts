import { classNames } from './class-names';

export type ButtonVariant = 'primary' | 'outline' | 'quiet' | 'danger';
export type ButtonSize = 'row' | 'small' | 'normal' | 'cab' | 'cab-tall';

const variants: Readonly<Record<ButtonVariant, string>> = {
  primary: 'border-lamp bg-lamp text-on-lamp hover:brightness-110 active:brightness-95',
  outline: 'border-line text-ink hover:border-faint hover:bg-raised active:bg-line',
  quiet: 'border-transparent text-soft hover:bg-raised hover:text-ink active:bg-line',
  danger: 'border-frozen text-frozen hover:bg-frozen hover:text-ground',
};

const sizes: Readonly<Record<ButtonSize, string>> = {
  /** at the end of a table's row: no taller than its line */
  row: '-my-1 min-h-7 rounded-md px-2 text-sm',
  small: 'min-h-8 rounded-md px-2.5 text-sm',
  normal: 'min-h-9 rounded-md px-3.5',
  cab: 'min-h-16 rounded-lg border-2 px-5 text-xl',
  'cab-tall': 'min-h-25 rounded-lg border-2 px-6 text-2xl',
};

export function buttonLook(variant: ButtonVariant, size: ButtonSize, isOff: boolean, className?: string): string {
  return classNames(
    'inline-flex select-none items-center justify-center gap-2 border pt-0.5 text-center font-semibold leading-tight transition-[background-color,border-color,color,filter]',
    sizes[size],
    variants[variant],
    isOff &&
      'cursor-not-allowed border-line bg-transparent text-faint hover:border-line hover:bg-transparent hover:text-faint hover:brightness-100',
    className,
  );
}
