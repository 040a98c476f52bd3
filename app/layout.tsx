import { type Metadata, type Viewport } from 'next';
import { type ReactNode } from 'react';
import { fontVariables } from '@/app/fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Eavewright: every wall on its own clock', template: '%s · Eavewright' },
  description: 'Eavewright tells the owner of a log-look home which wall to restain or recaulk, when, why, and how much to buy.',
  applicationName: 'Eavewright',
  formatDetection: { telephone: false, address: false, email: false, date: false },
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#1e4b39' },
    { media: '(prefers-color-scheme: dark)', color: '#163829' },
  ],
};

/** Holds no user data: each group of pages renders its own header. */
export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en-US" className={fontVariables}>
      <body>
        <a href="#main" className="sr-only bg-snow text-ink focus:not-sr-only focus:absolute focus:z-50 focus:p-4">
          Skip to the content
        </a>
        {children}
      </body>
    </html>
  );
}
