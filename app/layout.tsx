import type { Metadata, Viewport } from 'next'
import { connection } from 'next/server'
import type { ReactNode } from 'react'
import { Providers } from '@/components/frame/providers'
import { StagePatterns } from '@/components/ui/stage-patterns'
import { fontVariables } from './fonts'
import './globals.css'

export const metadata: Metadata = {
  title: { default: 'Turnrow: lessons from working farms', template: '%s · Turnrow' },
  description:
    'Lessons from working farms, filed by crop and growth stage, with viewers’ questions answered at the minute and a handbook whose figures name their source.',
  icons: { icon: { url: '/favicon.svg', type: 'image/svg+xml' }, apple: '/apple-touch-icon.png' },
  manifest: '/manifest.webmanifest',
}

export const viewport: Viewport = {
  colorScheme: 'light dark',
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#26221e' },
    { media: '(prefers-color-scheme: dark)', color: '#0f0e0c' },
  ],
}

export default async function RootLayout({ children }: { children: ReactNode }) {
  // A page drawn beforehand has no nonce in its scripts, and the policy would stop every one of them.
  await connection()
  return (
    <html lang="en" className={fontVariables}>
      <body className="flex min-h-dvh flex-col">
        <StagePatterns />
        <Providers>{children}</Providers>
      </body>
    </html>
  )
}
