'use client';

import { createContext, type ReactNode, useContext, useEffect, useState } from 'react';

interface Announcement {
  id: number;
  text: string;
}

type Announce = (text: string) => void;

const AnnounceContext = createContext<Announce>(() => undefined);

/** Says something to everyone: shown for a while, and read out politely by screen readers. */
export function useAnnounce(): Announce {
  return useContext(AnnounceContext);
}

const shownMs = 6000;

function Toast({ announcement, onEnd }: Readonly<{ announcement: Announcement; onEnd: (id: number) => void }>) {
  const { id, text } = announcement;
  useEffect(() => {
    const timer = setTimeout(() => onEnd(id), shownMs);
    return () => clearTimeout(timer);
  }, [id, onEnd]);
  return (
    <p className="appear pointer-events-auto max-w-sm rounded-md border bg-raised px-4 py-2.5 text-ink shadow-xl">
      {text}
    </p>
  );
}

export function AnnouncementsProvider({ children }: Readonly<{ children: ReactNode }>) {
  const [announcements, setAnnouncements] = useState<readonly Announcement[]>([]);
  const announce = (text: string) =>
    setAnnouncements((before) => [...before.slice(-2), { id: (before.at(-1)?.id ?? 0) + 1, text }]);
  const end = (id: number) => setAnnouncements((before) => before.filter((announcement) => announcement.id !== id));
  return (
    <AnnounceContext value={announce}>
      {children}
      <div
        role="status"
        aria-live="polite"
        className="pointer-events-none fixed inset-x-4 bottom-20 z-50 grid justify-items-center gap-2 md:bottom-6 print:hidden"
      >
        {announcements.map((announcement) => (
          <Toast key={announcement.id} announcement={announcement} onEnd={end} />
        ))}
      </div>
    </AnnounceContext>
  );
}

/** Reads its text to screen readers whenever it changes; shows nothing. */
export function LiveText({ children }: Readonly<{ children: ReactNode }>) {
  return (
    <p aria-live="polite" className="sr-only">
      {children}
    </p>
  );
}
