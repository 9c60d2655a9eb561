'use client'

import { cuttingWords, layers, type Layer } from '@/drafting/drawing'
import { Checkbox } from '@/components/ui/checkbox'
import { useStudioState } from '@/components/studio/use-store'

/** Layers a drafter turns on and off, in words; the others go with them. */
const switches: readonly { readonly label: string; readonly layers: readonly Layer[] }[] = [
  { label: 'Cutting lines and allowances', layers: ['cut', 'allowance-fill'] },
  { label: 'Stitching lines', layers: ['stitch'] },
  { label: 'Notches and marks', layers: ['notch', 'mark'] },
  { label: 'Grain and fold', layers: ['grain', 'fold'] },
  { label: 'Construction lines', layers: ['construction'] },
  { label: 'Labels', layers: ['label'] },
]

/** The layers that are drawn when a studio is opened. */
export const openingLayers: readonly Layer[] = layers.filter((layer) => layer !== 'construction')

/** What is on the sheet: pieces to show or put aside, and what is drawn of them. */
export function Pieces({
  hidden,
  onHide,
  shown,
  onShow,
  tags,
  onTags,
}: {
  readonly hidden: ReadonlySet<string>
  readonly onHide: (piece: string, hide: boolean) => void
  readonly shown: readonly Layer[]
  readonly onShow: (layers: readonly Layer[]) => void
  readonly tags: boolean
  readonly onTags: (on: boolean) => void
}) {
  const pieces = useStudioState((state) => state.resting?.pieces)
  return (
    <div className="grid gap-6 p-4">
      <fieldset className="grid gap-1">
        <legend className="mb-2 font-semibold">Pieces</legend>
        {pieces?.map((piece) => (
          <Checkbox
            key={piece.id}
            label={piece.name}
            hint={piece.cut.map((cut) => cuttingWords(cut)).join('; ')}
            checked={!hidden.has(piece.id)}
            onChange={(event) => onHide(piece.id, !event.target.checked)}
          />
        ))}
      </fieldset>
      <fieldset className="grid gap-1">
        <legend className="mb-2 font-semibold">Drawn on them</legend>
        <Checkbox
          label="Measurements and points"
          checked={tags}
          onChange={(event) => onTags(event.target.checked)}
        />
        {switches.map((each) => (
          <Checkbox
            key={each.label}
            label={each.label}
            checked={each.layers.every((layer) => shown.includes(layer))}
            onChange={(event) => {
              const rest = shown.filter((layer) => !each.layers.includes(layer))
              onShow(event.target.checked ? [...rest, ...each.layers] : rest)
            }}
          />
        ))}
      </fieldset>
    </div>
  )
}
