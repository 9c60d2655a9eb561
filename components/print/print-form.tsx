import { Download, FileDown } from 'lucide-react'
import { papers } from '@/drafting/drawing/papers'
import { buttonClass } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { Select } from '@/components/ui/select'
import { patternAddress } from './print-choices'
import type { PrintChoices } from './print-choices'

const ways = [
  { value: 'fewest', label: 'Whichever takes fewest sheets' },
  { value: 'portrait', label: 'Upright' },
  { value: 'landscape', label: 'On its side' },
]

const paperChoices = papers.map(({ id, name }) => ({ value: id, label: name }))

function isPaper(id: string): id is PrintChoices['paper'] {
  return papers.some((paper) => paper.id === id)
}

function isWay(way: string): way is PrintChoices['orientation'] {
  return way === 'fewest' || way === 'portrait' || way === 'landscape'
}

/** What to print on, and the two files: pages that tape together, or one sheet. */
export function PrintForm({
  base,
  choices,
  onChange,
  facts,
}: {
  /** See patternAddress. */
  readonly base: string
  readonly choices: PrintChoices
  readonly onChange: (choices: PrintChoices) => void
  /** How many sheets it takes, in words. */
  readonly facts?: string
}) {
  return (
    <div className="grid content-start gap-4">
      <Select
        label="Paper"
        choices={paperChoices}
        value={choices.paper}
        onChange={({ target }) => isPaper(target.value) && onChange({ ...choices, paper: target.value })}
      />
      <Select
        label="Way of the paper"
        choices={ways}
        value={choices.orientation}
        onChange={({ target }) => isWay(target.value) && onChange({ ...choices, orientation: target.value })}
      />
      <Checkbox
        label="With allowances"
        hint="Without them it is a nett pattern: the outline is the stitching line."
        checked={choices.allowances}
        onChange={({ target }) => onChange({ ...choices, allowances: target.checked })}
      />
      {facts && (
        <p className="border-t hairline pt-3 text-sm text-walnut" aria-live="polite">
          {facts}
        </p>
      )}
      <p className="text-sm">
        Print at 100 %, never “fit to page”. Print the first sheet alone and measure its two squares before
        you print the rest.
      </p>
      <div className="grid gap-2">
        <a className={buttonClass('primary')} href={patternAddress(base, 'pdf', choices)} download>
          <Download size={18} aria-hidden />
          Download the sheets (PDF)
        </a>
        <a className={buttonClass('plain')} href={patternAddress(base, 'svg', choices)} download>
          <FileDown size={18} aria-hidden />
          Download in one piece (SVG)
        </a>
      </div>
    </div>
  )
}
