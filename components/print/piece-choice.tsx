import { Checkbox } from '@/components/ui/checkbox'

/** Which pieces are printed: all, until one is left out. At least one stays. */
export function PieceChoice({
  all,
  chosen,
  onChange,
}: {
  readonly all: readonly { readonly id: string; readonly name: string }[]
  /** Ids; undefined for all. */
  readonly chosen: readonly string[] | undefined
  readonly onChange: (chosen: readonly string[] | undefined) => void
}) {
  const isChosen = (id: string) => chosen?.includes(id) ?? true
  const count = all.filter(({ id }) => isChosen(id)).length

  function turn(id: string) {
    const next = all.map((piece) => piece.id).filter((each) => isChosen(each) !== (each === id))
    if (next.length === 0) return
    onChange(next.length === all.length ? undefined : next)
  }

  return (
    <details className="border-t hairline pt-3">
      <summary className="min-h-6 cursor-pointer text-sm font-semibold">
        Pieces: {count === all.length ? 'all' : `${count} of ${all.length}`}
      </summary>
      <fieldset className="grid gap-2 pt-3">
        <legend className="sr-only">Pieces to print</legend>
        {all.map(({ id, name }) => (
          <Checkbox
            key={id}
            label={name}
            checked={isChosen(id)}
            disabled={count === 1 && isChosen(id)}
            onChange={() => turn(id)}
          />
        ))}
      </fieldset>
    </details>
  )
}
