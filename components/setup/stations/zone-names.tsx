const names = Intl.supportedValuesOf('timeZone');

/** The time zones that this machine knows, for inputs to complete from. */
export function ZoneNames({ id }: Readonly<{ id: string }>) {
  return (
    <datalist id={id}>
      {names.map((name) => (
        <option key={name} value={name} />
      ))}
    </datalist>
  );
}
