'use client';

import { type ComponentProps } from 'react';
import { classNames } from './class-names';
import { useField } from './field';
import { inputLook } from './input-look';

export type TextInputProps = Readonly<ComponentProps<'input'>>;

export function TextInput({ className, type = 'text', ...rest }: TextInputProps) {
  return <input {...useField()} {...rest} type={type} className={classNames(inputLook, className)} />;
}
