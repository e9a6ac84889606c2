import { type Metadata, type Viewport } from 'next';
import { unstable_rethrow } from 'next/navigation';
import { type ReactNode } from 'react';
import { getActor } from '@/lib/server/session';
import { figures, words } from './fonts';
import './globals.css';
import { Providers } from './providers';

export const metadata: Metadata = {
  title: { default: 'Rimewright', template: '%s, Rimewright' },
  description: 'Winter road care: which road refreezes first, and will a truck be there before it does.',
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  viewportFit: 'cover',
};

/** The person's theme; while the database cannot say, the system's. */
async function chosenTheme(): Promise<'system' | 'dark' | 'light'> {
  try {
    return (await getActor())?.theme ?? 'system';
  } catch (error) {
    unstable_rethrow(error);
    return 'system';
  }
}

export default async function RootLayout({ children }: Readonly<{ children: ReactNode }>) {
  return (
    <html lang="en" data-theme={await chosenTheme()} className={`${words.variable} ${figures.variable}`}>
      <body>
        <Providers>{children}</Providers>
      </body>
    </html>
  );
}
