import type { Metadata, Viewport } from 'next';
import { connection } from 'next/server';
import type { ReactNode } from 'react';
import { Providers } from '@/src/ui/providers';
import { nonce } from '@/src/web/page';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Chaffline', template: '%s · Chaffline' },
  description:
    'Which grains does starlight blow out? Radiation pressure on catalogues of dust, from real optical properties.',
};

export const viewport: Viewport = {
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#faf7f0' },
    { media: '(prefers-color-scheme: dark)', color: '#12162a' },
  ],
};

/** Plotly asks for this element and then leaves its stylesheet to us: the policy allows no inline styles. */
const plotlyStyles = <meta id="plotly.js-style-global" className="no-inline-styles" />;

export default async function RootLayout({ children }: { children: ReactNode }) {
  await connection();
  return (
    <html lang="en" suppressHydrationWarning>
      <head>{plotlyStyles}</head>
      <body>
        <a
          href="#content"
          className="bg-panel text-ink sr-only focus:not-sr-only focus:absolute focus:left-4 focus:top-4 focus:z-50 focus:px-4 focus:py-2"
        >
          Skip to the content
        </a>
        <Providers nonce={await nonce()}>{children}</Providers>
      </body>
    </html>
  );
}
