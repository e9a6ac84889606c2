/** The list with the element at `from` standing at `to`; unchanged when either is outside. */
export function moveTo<T>(list: readonly T[], from: number, to: number): readonly T[] {
  if (from < 0 || to < 0 || from >= list.length || to >= list.length) return list;
  const moved = list.slice(from, from + 1);
  const rest = [...list.slice(0, from), ...list.slice(from + 1)];
  return [...rest.slice(0, to), ...moved, ...rest.slice(to)];
}
