'use client';

import { createContext, type ComponentProps, useContext, useState } from 'react';

const PortalRootContext = createContext<HTMLElement | null>(null);

/** Where dialogs and sheets are drawn; null is the page's body. */
export function usePortalRoot(): HTMLElement | null {
  return useContext(PortalRootContext);
}

/** A part of the page with a theme of its own: what opens over it belongs to it and looks like it. */
export function PortalRoot({ children, ...rest }: Readonly<ComponentProps<'div'>>) {
  const [element, setElement] = useState<HTMLElement | null>(null);
  return (
    <PortalRootContext value={element}>
      <div {...rest} ref={setElement}>
        {children}
      </div>
    </PortalRootContext>
  );
}
