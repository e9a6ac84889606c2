'use client';

import { Segmented } from '@/components/ui/segmented';

export type Theme = 'system' | 'dark' | 'light';
export type Units = 'metric' | 'us';

export const themeOptions: readonly { value: Theme; label: string }[] = [
  { value: 'system', label: 'System' },
  { value: 'dark', label: 'Dark' },
  { value: 'light', label: 'Light' },
];

export const unitOptions: readonly { value: Units; label: string }[] = [
  { value: 'metric', label: 'Metric' },
  { value: 'us', label: 'US' },
];

export type PreferencesProps = Readonly<{
  units: Units;
  theme: Theme;
  onChange: (change: { units: Units } | { theme: Theme }) => void;
}>;

export function Preferences({ units, theme, onChange }: PreferencesProps) {
  return (
    <div className="grid gap-3">
      <Segmented label="Units" options={unitOptions} value={units} onChange={(next) => onChange({ units: next })} />
      <Segmented label="Theme" options={themeOptions} value={theme} onChange={(next) => onChange({ theme: next })} />
    </div>
  );
}
