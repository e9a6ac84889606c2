import { Section } from '@/components/ui/section';
import { type LedgerView } from '@/lib/contracts/ledger';

export type NeedsALookProps = Readonly<{ notes: LedgerView['notes'] }>;

export function NeedsALook({ notes }: NeedsALookProps) {
  return (
    <Section title="Needs a look">
      {notes.length === 0 ? (
        <p className="text-soft">Nothing stands out: every run kept to its plan within a tenth.</p>
      ) : (
        <ul>
          {notes.map((note) => (
            <li key={note.what} className="border-t py-3">
              <p className="font-semibold">{note.what}</p>
              <p className="text-soft">{note.cause}</p>
            </li>
          ))}
        </ul>
      )}
    </Section>
  );
}
