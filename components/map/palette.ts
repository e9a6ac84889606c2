const tokens = [
  'ground',
  'panel',
  'raised',
  'line',
  'ink',
  'soft',
  'faint',
  'lamp',
  'on-lamp',
  'frozen',
  'urgent',
  'closing',
  'hold',
  'safe',
  'sea',
  'shore',
] as const;

/** Token name → colour as the theme now has it, and the face of the words: a canvas cannot read CSS variables. */
export type Palette = Readonly<Record<string, string>> & { readonly face: string };

export function readPalette(element: Element): Palette {
  const style = getComputedStyle(element);
  const colours = Object.fromEntries(tokens.map((token) => [token, style.getPropertyValue(`--${token}`).trim()]));
  return { ...colours, face: style.fontFamily || 'sans-serif' };
}

/** Calls back when the theme changes, by the person or by the system; returns how to stop. */
export function watchTheme(onChange: () => void): () => void {
  const observer = new MutationObserver(onChange);
  observer.observe(document.documentElement, { attributes: true, attributeFilter: ['data-theme', 'class'] });
  const media = matchMedia('(prefers-color-scheme: dark)');
  media.addEventListener('change', onChange);
  return () => {
    observer.disconnect();
    media.removeEventListener('change', onChange);
  };
}
