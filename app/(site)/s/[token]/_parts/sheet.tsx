'use client'

import { Maximize, ZoomIn, ZoomOut } from 'lucide-react'
import { useState } from 'react'
import type { Unit } from '@/drafting/contract'
import { classes } from '@/components/ui/classes'

const zooms = [1, 1.5, 2.25, 3.5, 5] as const

/** The drawing, as the server drew it. It may be pulled about and made larger; its lines stay as thin as they are. */
export function Sheet({ svg, unit }: { readonly svg: string; readonly unit: Unit }) {
  const [step, setStep] = useState(0)
  const zoom = zooms[step] ?? 1
  return (
    <div className="relative border hairline bg-sheet">
      <div
        role="region"
        aria-label="The drawing"
        tabIndex={0}
        className={classes(
          'max-h-[76dvh] overflow-auto',
          unit === 'in' ? '[&_g[data-unit=cm]]:hidden' : '[&_g[data-unit=in]]:hidden',
        )}
      >
        <div
          className={classes('min-w-160 [&>svg]:block [&>svg]:w-full', step === 0 && '[&>svg]:max-h-[74dvh]')}
          style={{ width: `${zoom * 100}%` }}
          // Written by our own server, which escapes every name in it.
          dangerouslySetInnerHTML={{ __html: svg }}
        />
      </div>
      <div
        role="group"
        aria-label="Size"
        className="absolute right-2 bottom-2 flex rounded bg-panel shadow-float"
      >
        <ZoomButton label="Smaller" disabled={step === 0} onClick={() => setStep(step - 1)}>
          <ZoomOut size={20} aria-hidden />
        </ZoomButton>
        <ZoomButton label="Larger" disabled={step === zooms.length - 1} onClick={() => setStep(step + 1)}>
          <ZoomIn size={20} aria-hidden />
        </ZoomButton>
        <ZoomButton label="Whole sheet" disabled={step === 0} onClick={() => setStep(0)}>
          <Maximize size={20} aria-hidden />
        </ZoomButton>
      </div>
    </div>
  )
}

function ZoomButton({
  label,
  ...rest
}: {
  readonly label: string
  readonly disabled: boolean
  readonly onClick: () => void
  readonly children: React.ReactNode
}) {
  return (
    <button
      type="button"
      aria-label={label}
      title={label}
      className="grid size-11 place-items-center rounded text-indigo hover:bg-sheet disabled:opacity-40"
      {...rest}
    />
  )
}
