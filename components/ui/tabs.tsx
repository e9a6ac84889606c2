'use client';

import { Tabs as Primitive } from 'radix-ui';
import { type ReactNode } from 'react';
import { classNames } from './class-names';

export type TabsProps = Readonly<{
  label: string;
  tabs: readonly { value: string; label: ReactNode; content: ReactNode }[];
  value?: string;
  defaultValue?: string;
  onChange?: (value: string) => void;
  className?: string;
}>;

export function Tabs({ label, tabs, value, defaultValue, onChange, className }: TabsProps) {
  const chosen = value === undefined ? { defaultValue: defaultValue ?? tabs[0]?.value ?? '' } : { value };
  return (
    <Primitive.Root {...chosen} {...(onChange ? { onValueChange: onChange } : {})} className={classNames(className)}>
      <Primitive.List aria-label={label} className="flex gap-5 overflow-x-auto border-b">
        {tabs.map((tab) => (
          <Primitive.Trigger
            key={tab.value}
            value={tab.value}
            className="-mb-px min-h-10 border-b-2 border-transparent whitespace-nowrap text-soft transition-colors hover:text-ink data-[state=active]:border-lamp data-[state=active]:font-semibold data-[state=active]:text-ink"
          >
            {tab.label}
          </Primitive.Trigger>
        ))}
      </Primitive.List>
      {tabs.map((tab) => (
        <Primitive.Content key={tab.value} value={tab.value} className="pt-4">
          {tab.content}
        </Primitive.Content>
      ))}
    </Primitive.Root>
  );
}
