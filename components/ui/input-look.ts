/** The one look of everything that takes a value. */
export const inputLook =
  'min-h-9 w-full min-w-0 rounded-md border border-safe bg-panel px-2.5 py-1.5 text-ink transition-colors hover:border-faint aria-invalid:border-frozen disabled:cursor-not-allowed disabled:opacity-60';
