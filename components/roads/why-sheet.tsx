'use client';

import { type ReactNode } from 'react';
import { Sheet } from '@/components/ui/dialog';
import { Figure } from '@/components/ui/figure';
import { relativeInWords } from '@/lib/time/format';
import { type WhyContent } from './why-content';

export type WhySheetProps = Readonly<{
  isOpen: boolean;
  onOpenChange: (isOpen: boolean) => void;
  roadName: string;
  reason: string;
  why: WhyContent;
  /** For the age of what went in. */
  nowAt: number;
}>;

function Part({ title, children }: Readonly<{ title: string; children: ReactNode }>) {
  return (
    <section className="mb-6">
      <h3 className="mb-1.5 font-bold">{title}</h3>
      {children}
    </section>
  );
}

function Lines({ lines }: Readonly<{ lines: readonly string[] }>) {
  return (
    <ul className="grid gap-1.5 text-soft">
      {lines.map((line) => (
        <li key={line} className="border-l-2 pl-3">
          {line}
        </li>
      ))}
    </ul>
  );
}

/** Why this rate: inputs with their age and source, the equation in words, what bounded it, what to mind. */
export function WhySheet({ isOpen, onOpenChange, roadName, reason, why, nowAt }: WhySheetProps) {
  return (
    <Sheet isOpen={isOpen} onOpenChange={onOpenChange} title={`Why this for ${roadName}`} description={reason}>
      <Part title="What went in">
        <dl className="grid">
          {why.inputs.map((input) => (
            <div key={input.label} className="grid grid-cols-[1fr_auto] gap-x-4 border-b py-1.5">
              <dt>{input.label}</dt>
              <dd className="text-right font-semibold">
                {typeof input.value === 'string' ? (
                  input.value
                ) : (
                  <Figure value={input.value.amount} quantity={input.value.quantity} size="inline" />
                )}
              </dd>
              <dd className="col-span-2 text-sm text-soft">
                {input.source}
                {input.at === null ? null : `, ${relativeInWords(input.at, nowAt)}`}
              </dd>
            </div>
          ))}
        </dl>
      </Part>
      {why.steps.length > 0 ? (
        <Part title="How it was worked out">
          <ol className="grid list-decimal gap-1.5 pl-5 text-soft">
            {why.steps.map((step) => (
              <li key={step}>{step}</li>
            ))}
          </ol>
        </Part>
      ) : null}
      <Part title="What bounds it">
        {why.limits.length > 0 ? <Lines lines={why.limits} /> : <p className="text-soft">No limit was reached.</p>}
      </Part>
      {why.options.length > 0 ? <Options options={why.options} /> : null}
      <Part title="Mind">
        <Lines
          lines={[
            ...why.cautions,
            'Rates are decision support: local policy, product labels and licensed practice decide.',
          ]}
        />
      </Part>
    </Sheet>
  );
}

function Options({ options }: Readonly<Pick<WhyContent, 'options'>>) {
  return (
    <Part title="Every material">
      <ul className="grid">
        {options.map((option) => (
          <li key={option.materialName} className="grid grid-cols-[1fr_auto] gap-x-4 border-b py-1.5">
            <span className={option.isChosen ? 'font-semibold text-lamp' : ''}>
              {option.materialName}
              {option.isChosen ? ', chosen' : ''}
            </span>
            <Figure value={option.rateGPerM2} quantity="rate" size="inline" none="not offered" />
            {option.refusal ? <span className="col-span-2 text-sm text-soft">{option.refusal}</span> : null}
          </li>
        ))}
      </ul>
    </Part>
  );
}
