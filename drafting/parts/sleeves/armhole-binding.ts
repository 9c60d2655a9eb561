import type { Pen } from '../../pen/pen'
import { armholeLength, armholeStretch, armholeUses, type Armhole } from './armhole'
import type { Halves } from './sleeve-kind'

/** A strip on the bias that binds what a cap leaves of the armhole, from its front end under the arm to its back end. */
export function bindUnderarm(
  pen: Pen,
  armholes: { readonly front: Armhole; readonly back: Armhole },
  covered: Halves,
  whole: Halves,
): void {
  const left = { front: whole.front - covered.front, back: whole.back - covered.back }
  const uses = armholeUses(armholes.front) | armholeUses(armholes.back)
  pen.find('capBinding', left.front + left.back, uses | pen.usesOf(['capReach']))
  const strip = pen.piece('armhole-binding', 'Armhole binding')
  strip.start('end', { x: 0, y: 0 }, 'Mark the end of the strip on the true bias')
  strip.go('low', 'end', 'down', 'capBindingWidth', { say: 'Come down its width' })
  strip.go('far', 'end', 'right', 'capBinding', {
    say: 'Go along as far as the cap leaves the armhole open',
    stepKind: 'solve',
  })
  strip.square('lowFar', 'far', 'low', { say: 'Square down to the lower edge' })
  pen.tag({ piece: 'armhole-binding', from: 'end', to: 'far', label: 'Binding' })
  const turned = { role: 'free', finish: 'turned', allowance: 'armholeAllowance' } as const
  strip.line('sewn', 'end', 'far', {
    role: 'seam',
    allowance: 'armholeAllowance',
    say: 'The edge that is sewn to the armhole, stretched a little as it goes',
  })
  strip.line('far-end', 'far', 'lowFar', { ...turned, say: 'Its back end, caught under the cap' })
  strip.line('inner', 'lowFar', 'low', { ...turned, say: 'The inner edge, turned in and felled down' })
  strip.line('near-end', 'low', 'end', { ...turned, say: 'Its front end' })
  const wide = strip.at('low').y
  strip.grain({ x: wide, y: wide * 0.15 }, { x: wide * 1.7, y: wide * 0.85 })
  strip.cut({ cloth: 'main', count: 2, onFold: false, handed: false })
  pen.sew({
    id: 'armhole-binding',
    name: 'Binding of the armhole',
    a: [
      ...armholeStretch(armholes.front, covered.front, armholeLength(armholes.front)),
      ...armholeStretch(armholes.back, covered.back, armholeLength(armholes.back))
        .map((run) => ({ ...run, reversed: true }))
        .reverse(),
    ],
    b: [{ piece: 'armhole-binding', edge: 'sewn' }],
    matches: [{ a: left.front, b: left.front }],
  })
}
