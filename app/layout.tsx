import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { fontVariables } from './fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Tepidarium', template: '%s · Tepidarium' },
  description:
    'Solar heating for one house, worked hour by hour: what a homemade low-temperature array carries in a typical year, and at what cost.',
  icons: { icon: '/icon.svg' },
};

export const viewport: Viewport = {
  colorScheme: 'light dark',
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#f5f0e6' },
    { media: '(prefers-color-scheme: dark)', color: '#1d1c1a' },
  ],
};

/** What every page has: skip link and margins. Head, `main` and foot come with the frame of each group of pages. */
export default function RootLayout({ children }: Readonly<{ children: ReactNode }>) {
  return (
    <html lang="en-GB" className={fontVariables}>
      <body>
        <a
          href="#main"
          className="sr-only framed bg-paper focus:not-sr-only focus:absolute focus:top-2 focus:left-4 focus:z-10 focus:bg-paper"
        >
          Skip to the content
        </a>
        <div className="mx-auto max-w-[90rem] page-margin">{children}</div>
      </body>
    </html>
  );
}
