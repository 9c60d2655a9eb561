import { papers } from '@/drafting/drawing/papers'
import { Checkbox } from '@/components/ui/checkbox'
import { Select } from '@/components/ui/select'
import { DownloadLink } from './download-link'
import { PieceChoice } from './piece-choice'
import { patternAddress } from './print-choices'
import type { PrintChoices } from './print-choices'
import { PrinterCorrection } from './printer-correction'
import type { Printers } from './printer-correction'
import { RollWidth } from './roll-width'

const ways = [
  { value: 'fewest', label: 'Whichever takes fewest sheets' },
  { value: 'portrait', label: 'Upright' },
  { value: 'landscape', label: 'On its side' },
]
const paperChoices = [
  ...papers.map(({ id, name }) => ({ value: id, label: name })),
  { value: 'roll', label: 'A roll' },
]
const sizes = [
  { value: 'full', label: 'Full size, for cutting' },
  { value: 'half', label: 'Half size' },
  { value: 'quarter', label: 'Quarter size' },
  { value: 'fifth', label: 'Fifth size' },
]
const joins = [
  { value: 'trim', label: 'Lay one sheet over the other' },
  { value: 'butt', label: 'Edge to edge' },
]
const margins = [
  { value: '10', label: '10 mm' },
  { value: '15', label: '15 mm' },
  { value: '20', label: '20 mm' },
]

/** What to print on, and the two files: pages that tape together, or one sheet. */
export function PrintForm({
  base,
  choices,
  onChange,
  facts,
  pieces,
  printers,
}: {
  /** See patternAddress. */
  readonly base: string
  readonly choices: PrintChoices
  readonly onChange: (choices: PrintChoices) => void
  /** How many sheets it takes, in words. */
  readonly facts?: string
  /** To choose from; without them all are printed. */
  readonly pieces?: readonly { readonly id: string; readonly name: string }[]
  /** The printers that were measured before; see PrinterCorrection. */
  readonly printers?: Printers
}) {
  const change = (changed: Partial<PrintChoices>) => onChange({ ...choices, ...changed })
  return (
    <div className="grid content-start gap-4">
      <Select
        label="Paper"
        choices={paperChoices}
        value={choices.paper}
        onChange={({ target }) => change({ paper: target.value as PrintChoices['paper'] })}
      />
      {choices.paper === 'roll' ? (
        <RollWidth width={choices.roll} onChange={(roll) => change({ roll })} />
      ) : (
        <Select
          label="Way of the paper"
          choices={ways}
          value={choices.orientation}
          onChange={({ target }) => change({ orientation: target.value as PrintChoices['orientation'] })}
        />
      )}
      <Select
        label="Size"
        hint={choices.scale === 'full' ? undefined : 'For class and record. It is marked as not for cutting.'}
        choices={sizes}
        value={choices.scale}
        onChange={({ target }) => change({ scale: target.value as PrintChoices['scale'] })}
      />
      <Checkbox
        label="With allowances"
        hint="Without them it is a nett pattern: the outline is the stitching line."
        checked={choices.allowances}
        onChange={({ target }) => change({ allowances: target.checked })}
      />
      {pieces && (
        <PieceChoice all={pieces} chosen={choices.pieces} onChange={(chosen) => change({ pieces: chosen })} />
      )}
      <details className="border-t hairline pt-3">
        <summary className="min-h-6 cursor-pointer text-sm font-semibold">Sheets and ink</summary>
        <div className="grid gap-4 pt-3">
          <Select
            label="How sheets meet"
            choices={joins}
            value={choices.join}
            onChange={({ target }) => change({ join: target.value as PrintChoices['join'] })}
          />
          <Select
            label="Edge left free"
            hint="Most printers cannot print nearer to the edge than 7 mm."
            choices={margins}
            value={String(choices.margin)}
            onChange={({ target }) => change({ margin: Number(target.value) })}
          />
          <Checkbox
            label="All in black"
            hint="Lines are told apart by their dashes."
            checked={choices.black}
            onChange={({ target }) => change({ black: target.checked })}
          />
          <Checkbox
            label="Bold lines"
            hint="For a printer that runs dry."
            checked={choices.bold}
            onChange={({ target }) => change({ bold: target.checked })}
          />
        </div>
      </details>
      <PrinterCorrection
        measured={choices.measured}
        onChange={(measured) => change({ measured })}
        printers={printers}
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
        <DownloadLink look="primary" href={patternAddress(base, 'pdf', choices)} making="Making the sheets">
          Download the sheets (PDF)
        </DownloadLink>
        <DownloadLink look="plain" href={patternAddress(base, 'svg', choices)} making="Making the drawing">
          Download in one piece (SVG)
        </DownloadLink>
      </div>
    </div>
  )
}
