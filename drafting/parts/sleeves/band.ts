import type { Pen } from '../../pen/pen'
import { straight } from '../../pen/piece-pen'

/**
 * A straight band, closed to a ring and folded along its lower edge, into which the hem of the sleeve is gathered.
 *
 * @param by rules that give its length, its finished and its cut depth, and what is gathered into it.
 */
export function bandOf(
  pen: Pen,
  by: { readonly length: string; readonly depth: string; readonly fold: string; readonly gather: string },
): void {
  const band = pen.piece('sleeve-band', 'Sleeve band')
  band.start('end', { x: 0, y: 0 }, 'Mark the end of the band on a straight line')
  band.go('foldEnd', 'end', 'down', by.depth, { say: 'Come down the finished depth: here the band folds' })
  band.go('lowEnd', 'end', 'down', by.fold, {
    say: 'Come down twice the finished depth',
    drag: [by.depth],
  })
  band.go('meets', 'end', 'right', by.length, { say: 'Go along the length of the band', round: 'up' })
  band.square('lowMeets', 'meets', 'lowEnd', { say: 'Square down to the lower edge' })
  pen.tag({ piece: 'sleeve-band', from: 'end', to: 'meets', label: 'Arm band' })
  pen.tag({ piece: 'sleeve-band', from: 'end', to: 'foldEnd', label: 'Band depth', value: by.depth })
  const seam = { role: 'seam', allowance: 'sleeveAllowance' } as const
  band.line('gathered', 'end', 'meets', { ...seam, say: 'The edge that the sleeve is gathered into' })
  band.line('closing', 'meets', 'lowMeets', { ...seam, say: 'The end that closes the ring' })
  band.line('inner', 'lowMeets', 'lowEnd', {
    role: 'free',
    finish: 'turned',
    allowance: 'sleeveAllowance',
    say: 'The inner edge, turned in and felled down',
  })
  band.line('start', 'lowEnd', 'end', { ...seam, say: 'The end that it is closed to' })
  const fold = band.at('foldEnd')
  const far = { x: band.at('meets').x, y: fold.y }
  band.inner(
    'fold',
    'turn',
    straight(fold, far),
    'Fold the band here',
    band.usesOf('foldEnd', 'meets'),
    'line',
  )
  band.grain({ x: far.x * 0.3, y: fold.y * 0.5 }, { x: far.x * 0.6, y: fold.y * 0.5 })
  band.cut({ cloth: 'main', count: 2, onFold: false, handed: false })
  pen.sew({
    id: 'sleeve-band',
    name: 'Sleeve into its band',
    a: [{ piece: 'sleeve', edge: 'hem' }],
    b: [{ piece: 'sleeve-band', edge: 'gathered' }],
    join: 'gathered',
    easeFrom: by.gather,
  })
  pen.sew({
    id: 'sleeve-band-ends',
    name: 'Ends of the sleeve band',
    a: [{ piece: 'sleeve-band', edge: 'closing' }],
    b: [{ piece: 'sleeve-band', edge: 'start', reversed: true }],
  })
}
