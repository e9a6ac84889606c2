import clsx, { type ClassValue } from 'clsx';
import { twMerge } from 'tailwind-merge';

/** Class names joined; of two that set the same property the later wins, so that a caller can adjust a part. */
export function classNames(...values: ClassValue[]): string {
  return twMerge(clsx(values));
}
