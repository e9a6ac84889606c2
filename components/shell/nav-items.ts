/** One place of the rail. Which of them a person sees is decided by whoever renders the shell. */
export interface NavItem {
  href: string;
  label: string;
}

/** The item that the address belongs to: the longest that it begins with. */
export function activeItem(items: readonly NavItem[], pathname: string): NavItem | null {
  const matching = items.filter((item) => pathname === item.href || pathname.startsWith(`${item.href}/`));
  return matching.reduce<NavItem | null>(
    (best, item) => (item.href.length > (best?.href.length ?? 0) ? item : best),
    null,
  );
}
