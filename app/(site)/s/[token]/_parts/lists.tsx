import { CircleCheck, TriangleAlert } from 'lucide-react'
import type { Unit } from '@/drafting/contract'
import type { SharedCheck, SharedView } from '@/app/_server/share/shared-view'

/** The lengths on the drawing as a list, piece by piece: the same that stand on its lines. */
export function Lengths({ tags, unit }: { readonly tags: SharedView['tags']; readonly unit: Unit }) {
  const pieces = [...new Set(tags.map((tag) => tag.piece))]
  return (
    <section aria-labelledby="lengths">
      <h2 id="lengths" className="mb-3 text-lg font-semibold">
        Lengths
      </h2>
      {pieces.map((piece) => (
        <div key={piece} className="mb-5">
          <h3 className="font-semibold">{piece}</h3>
          <dl>
            {tags
              .filter((tag) => tag.piece === piece)
              .map((tag, index) => (
                <div key={index} className="flex justify-between gap-4 border-b hairline py-1">
                  <dt>{tag.label}</dt>
                  <dd className="measure font-semibold">{tag.length[unit]}</dd>
                </div>
              ))}
          </dl>
        </div>
      ))}
    </section>
  )
}

/** Whether the edges that are sewn together come out alike. */
export function Checks({ checks, unit }: { readonly checks: readonly SharedCheck[]; readonly unit: Unit }) {
  return (
    <section aria-labelledby="checks">
      <h2 id="checks" className="mb-3 text-lg font-semibold">
        Seam checks
      </h2>
      <ul>
        {checks.map((check) => (
          <Check key={check.name} check={check} unit={unit} />
        ))}
      </ul>
    </section>
  )
}

function Check({ check, unit }: { readonly check: SharedCheck; readonly unit: Unit }) {
  const Icon = check.good ? CircleCheck : TriangleAlert
  return (
    <li className="flex gap-2.5 border-b hairline py-1.5">
      <Icon
        size={18}
        aria-hidden
        className={check.good ? 'mt-0.75 shrink-0 text-fern' : 'mt-0.75 shrink-0 text-weld'}
      />
      <span>
        {check.name}
        <span className="sr-only">{check.good ? ', checks out' : ', needs a look'}</span>
        <span className="measure block text-sm text-walnut">{check.words[unit]}</span>
      </span>
    </li>
  )
}

/** What to cut. */
export function Pieces({ pieces }: { readonly pieces: SharedView['pieces'] }) {
  return (
    <section aria-labelledby="pieces">
      <h2 id="pieces" className="mb-3 text-lg font-semibold">
        Pieces
      </h2>
      <ul>
        {pieces.map((piece) => (
          <li key={piece.name} className="border-b hairline py-1.5">
            <span className="font-semibold">{piece.name}</span>
            {piece.cut.map((words) => (
              <span key={words} className="block text-sm text-walnut">
                {words}
              </span>
            ))}
          </li>
        ))}
      </ul>
    </section>
  )
}
