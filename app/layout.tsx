import type { Metadata, Viewport } from 'next'
import { cookies } from 'next/headers'
import { connection } from 'next/server'
import type { ReactNode } from 'react'
import { themeCookie, themeFrom } from '@/components/ui/theme'
import { ToastShelf } from '@/components/ui/toast'
import './globals.css'

export const metadata: Metadata = {
  title: { default: 'Chalkfold', template: '%s · Chalkfold' },
  description: 'Flat pattern drafting for dressmakers: measure, draft, check, print.',
  icons: { icon: '/icons/mark.svg', apple: '/icons/mark-192.png' },
  manifest: '/manifest.webmanifest',
  appleWebApp: { title: 'Chalkfold' },
}

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  viewportFit: 'cover',
  interactiveWidget: 'resizes-content',
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#f7f4ec' },
    { media: '(prefers-color-scheme: dark)', color: '#12162a' },
  ],
}

/** The page around every page. It waits for the request, because each answer carries its own script nonce. */
export default async function RootLayout({ children }: { children: ReactNode }) {
  await connection()
  const theme = themeFrom((await cookies()).get(themeCookie)?.value)
  return (
    <html lang="en" data-theme={theme}>
      <body>
        <ToastShelf>{children}</ToastShelf>
      </body>
    </html>
  )
}
