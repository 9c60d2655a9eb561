import type { DesignValue } from '../../contract'
import { length } from '../../pen/design'
import { straight } from '../../pen/piece-pen'
import { roomUses, slitForHead } from './head-room'
import { onFold, type Opening } from './opening'

const asked = { id: 'backOpening', is: ['front slit'] }

export const frontSlitDesign: readonly DesignValue[] = [
  length('frontSlit', 'Front slit, depth', 'opening', { default: 180, min: 60, max: 250 }, asked),
]

/** A slit down the centre front from a close neck, faced; both centres on the fold. */
export const frontSlit: Opening = {
  draw: (pen, front, back, dropped) => {
    onFold(front)
    onFold(back)
    const { piece } = front
    const wanted = pen.length('frontSlit')
    const least = slitForHead(pen, piece, back.piece, dropped)
    const depth = Math.max(wanted, pen.tape ? Math.ceil(least / pen.tape) * pen.tape : least)
    const top = piece.at('centreNeck')
    const end = { x: top.x, y: top.y + depth }
    const say = 'Down the fold mark the end of the slit'
    if (depth === wanted) {
      piece.go('keyholeEnd', 'centreNeck', 'down', 'frontSlit', { say, drag: ['frontSlit'] })
    } else {
      piece.place('keyholeEnd', end, {
        say,
        mask: roomUses(pen, piece, back.piece),
        uses: ['frontSlit'],
        through: ['centreNeck'],
        stepKind: 'solve',
      })
      pen.caution(
        'slit-deepened',
        `The slit is drawn ${pen.say(depth)} deep so that the neck goes over the head. Open the neck wider for a shorter one.`,
        'frontSlit',
        'neckWidening',
      )
    }
    pen.tag({
      piece: piece.id,
      from: 'centreNeck',
      to: 'keyholeEnd',
      label: 'Slit',
      ...(depth === wanted ? { value: 'frontSlit' } : {}),
    })
    piece.inner(
      'slit',
      'placement',
      straight(top, end),
      'Stitch the facing on along both sides of the slit, 2 mm from it and to a point; cut and turn',
      piece.usesOf('keyholeEnd'),
    )
    return { front: { kind: 'fold', keyhole: { depth, half: 2 } }, back: { kind: 'fold' } }
  },
}
