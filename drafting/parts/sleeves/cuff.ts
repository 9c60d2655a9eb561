import type { Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'

/**
 * A straight cuff, folded along its lower edge, into which the hem of a sleeve is gathered from one side of its slit round to
 * the other; its lap buttons over.
 *
 * @param slitAt where the slit stands, mm along the hem from the front underarm seam.
 */
export function cuffOf(pen: Pen, sleeve: PiecePen, slitAt: number): void {
  const cuff = pen.piece('sleeve-cuff', 'Sleeve cuff')
  cuff.start('end', { x: 0, y: 0 }, 'Mark the end of the cuff on a straight line')
  cuff.go('foldEnd', 'end', 'down', 'cuffDepth', { say: 'Come down the finished depth: here the cuff folds' })
  cuff.go('lowEnd', 'end', 'down', 'cuffFold', {
    say: 'Come down twice the finished depth',
    drag: ['cuffDepth'],
  })
  cuff.go('meets', 'end', 'right', 'cuffRound', { say: 'Go along the wrist and its ease', round: 'up' })
  cuff.go('lapEnd', 'meets', 'right', 'cuffLap', { say: 'Go on by the lap', drag: ['cuffLap'] })
  cuff.square('lowLapEnd', 'lapEnd', 'lowEnd', { say: 'Square down to the lower edge' })
  pen.tag({ piece: 'sleeve-cuff', from: 'end', to: 'meets', label: 'Cuff' })
  pen.tag({ piece: 'sleeve-cuff', from: 'meets', to: 'lapEnd', label: 'Lap', value: 'cuffLap' })
  pen.tag({ piece: 'sleeve-cuff', from: 'end', to: 'foldEnd', label: 'Cuff depth', value: 'cuffDepth' })
  const turned = { role: 'free', finish: 'turned', allowance: 'sleeveAllowance' } as const
  cuff.line('gathered', 'end', 'meets', {
    role: 'seam',
    allowance: 'sleeveAllowance',
    say: 'The edge that the sleeve is gathered into',
  })
  cuff.line('lap', 'meets', 'lapEnd', { ...turned, say: 'Over the lap nothing is sewn on' })
  cuff.line('lap-end', 'lapEnd', 'lowLapEnd', { ...turned, say: 'The end that laps over' })
  cuff.line('inner', 'lowLapEnd', 'lowEnd', { ...turned, say: 'The inner edge, turned in and felled down' })
  cuff.line('start', 'lowEnd', 'end', { ...turned, say: 'The end that lies under' })
  const fold = cuff.at('foldEnd')
  const far = { x: cuff.at('lapEnd').x, y: fold.y }
  const uses = cuff.usesOf('foldEnd', 'lapEnd')
  cuff.inner('fold', 'turn', straight(fold, far), 'Fold the cuff here', uses, 'line')
  const inset = pen.value('cuffLap') / 2
  for (const [id, x, say] of [
    ['button', inset, 'Mark the button'],
    ['buttonhole', far.x - inset, 'Mark the middle of the buttonhole'],
  ] as const) {
    const at = { x, y: fold.y / 2 }
    cuff.place(id, at, { say, kind: 'button', uses: ['cuffLap', 'cuffDepth', 'cuffRound'] })
  }
  cuff.grain({ x: far.x * 0.3, y: fold.y * 0.5 }, { x: far.x * 0.6, y: fold.y * 0.5 })
  cuff.cut(
    { cloth: 'main', count: 2, onFold: false, handed: false },
    { cloth: 'interfacing', count: 2, onFold: false, handed: false },
  )
  pen.notion({ kind: 'button', count: 2 })
  slit(pen, sleeve)
  gather(pen, sleeve, slitAt)
}

/** The slit at the back of the hem: cut after it is bound or faced. */
function slit(pen: Pen, sleeve: PiecePen): void {
  const low = sleeve.at('droppedHem')
  const high = { x: low.x, y: low.y - pen.value('cuffSlit') }
  const uses = sleeve.usesOf('droppedHem') | pen.usesOf(['cuffSlit'])
  sleeve.inner('slit', 'placement', straight(low, high), 'Mark the slit, upright from the lowest point', uses)
}

function gather(pen: Pen, sleeve: PiecePen, slitAt: number): void {
  const whole = sleeve.lengthOf('hem')
  const behind = whole - slitAt
  const round = pen.lengthRounded('cuffRound', 'up')
  pen.sew({
    id: 'sleeve-cuff',
    name: 'Sleeve into its cuff',
    a: [
      { piece: 'sleeve', edge: 'hem', from: slitAt },
      { piece: 'sleeve', edge: 'hem', to: slitAt },
    ],
    b: [{ piece: 'sleeve-cuff', edge: 'gathered' }],
    join: 'gathered',
    easeFrom: 'bishopGather',
    matches: [{ a: behind, b: (round * behind) / whole }],
  })
  sleeve.notch('slit', 'hem', slitAt, 2)
}
