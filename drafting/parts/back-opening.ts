import type { DesignValue, RuleDefinition } from '../contract'
import { length, choice } from '../pen/design'
import { lengthRule } from '../pen/garment'
import { nothing } from '../pen/masks'
import type { Pen } from '../pen/pen'
import { straight, type PiecePen } from '../pen/piece-pen'

export const openingDesign: readonly DesignValue[] = [
  choice('backOpening', 'Back opening', 'opening', ['zip', 'none']),
  length(
    'zipLength',
    'Zip length',
    'opening',
    { default: 380, min: 150, max: 500 },
    { id: 'backOpening', is: ['zip'] },
  ),
]

export const openingRules: readonly RuleDefinition[] = [
  lengthRule('headRoom', 'Opening to go over the head', 'head + 2cm'),
]

/**
 * Closes the centre back of a piece: a seam with a zip in its upper part, or the fold. A neck that does not go over the head
 * and has no zip gets a slit on the fold, long enough, with a caution.
 *
 * @returns whether the centre back lies on the fold.
 */
export function backOpening(pen: Pen, back: PiecePen): boolean {
  const neck = 2 * (back.lengthOf('neckline') + frontNeck(pen))
  if (pen.chosen('backOpening') === 'none') {
    back.line('centre', 'lengthMark', 'centreNeck', { role: 'fold', say: 'The centre back lies on the fold' })
    const short = pen.value('headRoom') - neck
    if (short > 0) slit(pen, back, Math.max(60, Math.ceil(short / 2 / 5) * 5))
    return true
  }
  const asked = pen.length('zipLength')
  const room = back.at('lengthMark').y - back.at('centreNeck').y - 60
  const zip = pen.tape ? Math.min(asked, Math.floor(room / pen.tape) * pen.tape) : Math.min(asked, room)
  const level = back.mark('lengthMark').y | back.mark('centreNeck').y
  pen.find('zipDrawn', zip, pen.usesOf(['zipLength']) | (zip < asked ? level : nothing))
  if (zip < asked) {
    pen.caution(
      'zip-shortened',
      `A zip that long would run into the hem, so the opening is drawn ${pen.say(zip)} long.`,
      'zipLength',
      'length',
    )
  }
  back.go('zipEnd', 'centreNeck', 'down', 'zipDrawn', {
    say: 'Down the centre back mark the end of the zip',
    drag: ['zipLength'],
  })
  pen.tag({
    piece: back.id,
    from: 'centreNeck',
    to: 'zipEnd',
    label: 'Zip',
    ...(zip < asked ? {} : { value: 'zipLength' }),
  })
  back.line('centre', 'lengthMark', 'zipEnd', {
    role: 'seam',
    allowance: 'centreBackAllowance',
    corner: 'turned',
    say: 'The centre back seam, from the hem to the zip',
  })
  back.line('opening', 'zipEnd', 'centreNeck', {
    role: 'opening',
    allowance: 'centreBackAllowance',
    say: 'The opening for the zip',
  })
  back.notch('zip-end', 'opening', 0, 2)
  pen.sew({
    id: 'centre-back',
    name: 'Centre back',
    a: [{ piece: back.id, edge: 'centre' }],
    b: [{ piece: back.id, edge: 'centre', mirrored: true }],
    smooth: true,
  })
  pen.notion({ kind: 'zip', length: zip, count: 1 })
  return false
}

function frontNeck(pen: Pen): number {
  return pen.pieces.find((piece) => piece.id === 'front')?.lengthOf('neckline') ?? 0
}

function slit(pen: Pen, back: PiecePen, long: number): void {
  const top = back.at('centreNeck')
  back.inner(
    'slit',
    'placement',
    straight(top, { x: 0, y: top.y + long }),
    'Slit the centre back so that the neck goes over the head; face it and close it with a loop and button',
    pen.usesOf(['headRoom']) | back.edge('neckline').uses,
  )
  pen.notion({ kind: 'button', count: 1 })
  pen.caution(
    'slit-added',
    `The neck alone does not go over the head, so the centre back is slit ${pen.say(long)} down. Choose a zip or a wider neck to do without.`,
    'backOpening',
    'neckWidening',
  )
}
